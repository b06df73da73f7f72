import { Button } from '../../../components/ui/button.tsx';
import { ApiError } from '../../../lib/api-error.ts';
import { useUndoChanges } from '../../buildings/api/undo-changes.ts';

/** What was done last, and the changes that it was. */
export type Done = { readonly words: string; readonly changeIds: readonly string[] };

type DoneLineProps = {
  readonly schemeId: string;
  readonly done: Done;
  readonly onDone: (done: Done) => void;
  readonly onClose: () => void;
};

function whyNot(error: Error): string {
  return error instanceof ApiError ? error.message : 'Something failed on this page.';
}

/** Says what was done, and undoes it. */
export function DoneLine({ schemeId, done, onDone, onClose }: DoneLineProps) {
  const undo = useUndoChanges(schemeId);
  const { words, changeIds } = done;
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1 text-small">
      <p role="status">
        {words}
        {undo.error !== null && (
          <span className="ml-2 font-medium text-clay-deep">
            It was not undone. {whyNot(undo.error)}
          </span>
        )}
      </p>
      {changeIds.length > 0 && (
        <Button
          kind="quiet"
          className="h-6"
          busy={undo.isPending}
          onClick={() => {
            undo.mutate(changeIds, {
              onSuccess: () => {
                onDone({ words: `Undone: ${words}`, changeIds: [] });
              },
            });
          }}
        >
          Undo
        </Button>
      )}
      <Button kind="quiet" className="h-6" aria-label="Close the note" onClick={onClose}>
        Close
      </Button>
    </div>
  );
}
