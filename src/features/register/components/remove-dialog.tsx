import { useState } from 'react';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { useRemoveMany } from '../../buildings/api/remove-many.ts';
import type { Marks } from '../hooks/use-marks.ts';
import type { Done } from './done-line.tsx';

type RemoveDialogProps = {
  readonly schemeId: string;
  readonly marks: Pick<Marks, 'filter' | 'count'>;
  readonly onClose: () => void;
  readonly onDone: (done: Done) => void;
};

/** Asks once before buildings are taken out. */
export function RemoveDialog({ schemeId, marks, onClose, onDone }: RemoveDialogProps) {
  // what was marked when it was opened
  const [{ filter, count }] = useState(marks);
  const isOne = count === 1;
  const many = isOne ? 'this building' : `these ${formatCount(count)} buildings`;
  const removed = isOne ? 'One building removed.' : `${formatCount(count)} buildings removed.`;
  const remove = useRemoveMany(schemeId, ({ changeId }) => {
    onDone({ words: removed, changeIds: [changeId] });
    onClose();
  });
  return (
    <ConfirmDialog
      open
      title={`Remove ${many}?`}
      doIt={isOne ? 'Remove' : `Remove ${formatCount(count)}`}
      busy={remove.isPending}
      onConfirm={() => {
        remove.mutate({ filter, expected: count });
      }}
      onClose={onClose}
    >
      <MutationError failed="Nothing was removed." error={remove.error} />
      <p>
        {isOne ? 'It goes' : 'They go'} from the register and the plan. The history stays, and it
        can be undone.
      </p>
    </ConfirmDialog>
  );
}
