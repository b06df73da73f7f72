import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useRemoveBuilding } from '../../buildings/api/remove-building.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';

type RemoveDialogProps = Pick<PlanDrawing, 'schemeId' | 'removing' | 'done'> & {
  readonly select: (buildingId: number | null) => void;
};

/** Asks before a building is taken out of the register. */
export function RemoveDialog({ schemeId, removing, done, select }: RemoveDialogProps) {
  const { building, setRemoving } = removing;
  const remove = useRemoveBuilding(schemeId);

  function confirm(): void {
    if (building === undefined) return;
    const { id, version, reference } = building;
    remove.mutate(
      { id, version },
      {
        onSuccess: ({ changeId }) => {
          done.push({ changeId, words: `${reference} is removed.`, before: id });
        },
        onError: () => {
          select(id);
          setRemoving(true);
        },
      },
    );
    // what is not there any more is not asked for again
    select(null);
    setRemoving(false);
  }
  return (
    <ConfirmDialog
      open={building !== undefined}
      title={`Remove ${building?.reference ?? ''}?`}
      doIt="Remove it"
      busy={remove.isPending}
      onConfirm={confirm}
      onClose={() => {
        setRemoving(false);
        // a dialog that closes itself is told of as well: what is under way goes on
        if (!remove.isPending) remove.reset();
      }}
    >
      <MutationError failed="The building was not removed." error={remove.error} />
      <p>It leaves the plan and the register. Its history stays, and this can be undone.</p>
    </ConfirmDialog>
  );
}
