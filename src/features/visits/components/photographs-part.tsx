import { PHOTOGRAPH_TYPES, VISIT_LIMITS } from '../../../../shared/schemas/visits.ts';
import { FileButton } from '../../../components/ui/file-button.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import type { VisitDraft } from '../hooks/use-visit-draft.ts';
import { PhotographFields } from './photograph-fields.tsx';

const ACCEPT = PHOTOGRAPH_TYPES.join();

/** What was taken, each with its caption. */
export function PhotographsPart({ draft }: { readonly draft: VisitDraft }) {
  const { photographs } = draft.visit;
  function add(file: File): void {
    void draft.photographs.add(file);
  }
  return (
    <Panel title="Photographs">
      {photographs.map((photograph, index) => (
        <PhotographFields
          key={photograph.id}
          photograph={photograph}
          number={index + 1}
          onChange={(part) => {
            draft.photographs.change(photograph.id, part);
          }}
          onRemove={() => void draft.photographs.remove(photograph.id)}
        />
      ))}
      {photographs.length < VISIT_LIMITS.photographs && (
        <div className="mt-3 flex flex-wrap gap-2">
          <FileButton label="Take a photograph" accept={ACCEPT} camera onFile={add}>
            Take a photograph
          </FileButton>
          <FileButton label="Choose a photograph" accept={ACCEPT} onFile={add}>
            Choose one
          </FileButton>
        </div>
      )}
    </Panel>
  );
}
