import { useState } from 'react';
import type { WorkingSection } from '../../../../shared/assessment/working-of-wall.ts';
import { workingText } from '../../../../shared/presentation/working-words.ts';
import { CopyButton } from './copy-button.tsx';
import { WorkingLines } from './working-lines.tsx';

type PartProps = { readonly section: WorkingSection; readonly startsOpen: boolean };

/** A part of the working; what is closed is not typeset, and not printed. */
function Part({ section: { title, lines }, startsOpen }: PartProps) {
  const [isOpen, setOpen] = useState(startsOpen);
  return (
    <details
      open={isOpen}
      onToggle={({ currentTarget }) => {
        setOpen(currentTarget.open);
      }}
      className="border-b border-rule print:border-b-0 print:[&:not([open])]:hidden"
    >
      <summary className="py-1.5 text-small font-semibold max-sm:py-3 print:break-after-avoid">
        {title}
      </summary>
      {isOpen && (
        <div className="pb-2 print:pb-0">
          <div
            role="region"
            aria-label={title}
            tabIndex={0}
            className="overflow-x-auto print:overflow-visible"
          >
            <WorkingLines lines={lines} />
          </div>
          <CopyButton textOf={() => workingText(title, lines)}>Copy as text</CopyButton>
        </div>
      )}
    </details>
  );
}

/** The whole working of a wall, part by part; what governs is open from the start. */
export function WorkingList({ sections }: { readonly sections: readonly WorkingSection[] }) {
  return (
    <div>
      {sections.map((section, index) => (
        // the titles tell where a zone ends, which moves while somebody tries figures out
        <Part key={index} section={section} startsOpen={section.title.includes('governs')} />
      ))}
    </div>
  );
}
