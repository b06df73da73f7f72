import { Button } from '../../../components/ui/button.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import type { SectionLine } from '../section-line.ts';

function wordsOf({ editor, design, options, mayEdit }: SectionLine): string {
  if (editor.isDrawing && design !== null) return 'End the line to see its section.';
  if (editor.isEditing) return 'Draw two points and give the level of the axis to see the section.';
  if (options.length > 0) return 'No option is shown. Choose one above the map to see its section.';
  return mayEdit
    ? 'No line yet. Draw one to see its section.'
    : 'No line yet. Its section stands here once a designer has drawn one.';
}

/** In place of a section while there is no line to cut. */
export function EmptySection({
  line,
  onHide,
}: {
  readonly line: SectionLine;
  readonly onHide: () => void;
}) {
  const canDraw = line.mayBegin && line.options.length === 0;
  return (
    <div className="flex items-start justify-between gap-4 px-4">
      <EmptyState action={canDraw && <Button onClick={line.draw}>Draw the line</Button>}>
        {wordsOf(line)}
      </EmptyState>
      <Button kind="quiet" className="mt-2.5" aria-label="Hide the section" onClick={onHide}>
        Hide
      </Button>
    </div>
  );
}
