import { Button } from '../../../components/ui/button.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';

/** What was saved last, and the way to take it back. */
export function DoneLine({ done }: Pick<PlanDrawing, 'done'>) {
  const { told, error, isUndoing, undo } = done;
  return (
    <>
      <MutationError failed="It was not undone." error={error} />
      <DoneNote>
        {told !== null && (
          <p className="mb-3 flex items-baseline gap-2 border-l-4 border-ink bg-paper-sunk px-3 py-1.5">
            <span className="min-w-0 flex-1 break-words">{told.words}</span>
            {told.mayUndo && (
              <Button kind="quiet" className="h-6" busy={isUndoing} onClick={undo}>
                Undo{' '}
                <span className="max-sm:hidden">
                  <KeyCap>Ctrl Z</KeyCap>
                </span>
              </Button>
            )}
          </p>
        )}
      </DoneNote>
    </>
  );
}
