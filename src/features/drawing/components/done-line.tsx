import { Button } from '../../../components/ui/button.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';

const STEPS = {
  undo: { words: 'Undo', keys: 'Ctrl Z' },
  redo: { words: 'Redo', keys: 'Ctrl Shift Z' },
} as const;

/** What was saved last, and the way to take it back, or to do it again. */
export function DoneLine({ done }: Pick<PlanDrawing, 'done'>) {
  const { told, failed, isBusy } = done;
  return (
    <>
      <MutationError failed="It was not undone." error={failed.undo} />
      <MutationError failed="It was not done again." error={failed.redo} />
      <DoneNote>
        {told !== null && (
          <p className="mb-3 flex items-baseline gap-2 border-l-4 border-ink bg-paper-sunk px-3 py-1.5">
            <span className="min-w-0 flex-1 break-words">{told.words}</span>
            <Button kind="quiet" className="h-6 flex-none" busy={isBusy} onClick={done[told.next]}>
              {STEPS[told.next].words}{' '}
              <span className="max-sm:hidden">
                <KeyCap>{STEPS[told.next].keys}</KeyCap>
              </span>
            </Button>
          </p>
        )}
      </DoneNote>
    </>
  );
}
