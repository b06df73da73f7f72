import { Button } from '../../../components/ui/button.tsx';
import { ApiError } from '../../../lib/api-error.ts';
import { useUndoChanges } from '../../buildings/api/undo-changes.ts';

/** What was done last or taken back, and the changes that it was; without any it is not undone here. */
export type Done = {
  readonly words: string;
  readonly changeIds: readonly string[];
  readonly isUndone?: boolean;
};

type DoneLineProps = {
  readonly schemeId: string;
  readonly done: Done;
  readonly onDone: (done: Done | null) => void;
};

function whyNot(error: Error): string {
  return error instanceof ApiError ? error.message : 'Something failed on this page.';
}

/** Says what was done, undoes it, and does it again. */
export function DoneLine({ schemeId, done, onDone }: DoneLineProps) {
  const turn = useUndoChanges(schemeId);
  const { words, changeIds, isUndone = false } = done;
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1 text-small">
      <p role="status">
        {isUndone ? `Undone: ${words}` : words}
        {turn.error !== null && (
          <span className="ml-2 font-medium text-clay-deep">
            It was not {isUndone ? 'done again' : 'undone'}. {whyNot(turn.error)}
          </span>
        )}
      </p>
      {changeIds.length > 0 && (
        <Button
          kind="quiet"
          className="h-6"
          busy={turn.isPending}
          onClick={() => {
            turn.mutate(changeIds, {
              onSuccess: (made) => {
                const ids = made.map(({ changeId }) => changeId);
                onDone({ words, changeIds: ids, isUndone: !isUndone });
              },
            });
          }}
        >
          {isUndone ? 'Redo' : 'Undo'}
        </Button>
      )}
      <Button
        kind="quiet"
        className="h-6"
        aria-label="Close the note"
        onClick={() => {
          onDone(null);
        }}
      >
        Close
      </Button>
    </div>
  );
}
