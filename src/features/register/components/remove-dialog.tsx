import { useQueryClient } from '@tanstack/react-query';
import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { ApiError } from '../../../lib/api-error.ts';
import { useRemoveBuildings } from '../../buildings/api/remove-buildings.ts';
import { fetchSeen } from '../api/get-seen.ts';
import type { Marks } from '../hooks/use-marks.ts';
import type { Done } from './done-line.tsx';

type RemoveDialogProps = {
  readonly schemeId: string;
  readonly marks: Pick<Marks, 'filter' | 'count'>;
  readonly onClose: () => void;
  readonly onDone: (done: Done) => void;
};

function removedWords(count: number, fault: Error | null): string {
  const words = count === 1 ? 'One building removed.' : `${count} buildings removed.`;
  if (fault === null) return words;
  return `${words} Then it stopped. ${fault instanceof ApiError ? fault.message : ''}`;
}

/** Asks once before buildings are taken out. */
export function RemoveDialog({ schemeId, marks, onClose, onDone }: RemoveDialogProps) {
  const client = useQueryClient();
  const [{ filter, count }] = useState(marks);
  const remove = useRemoveBuildings(schemeId);
  const removal = useMutation({
    mutationFn: async () => remove.mutateAsync(await fetchSeen(client, schemeId, filter)),
    onSuccess: ({ changeIds, fault }) => {
      onDone({ words: removedWords(changeIds.length, fault), changeIds });
      onClose();
    },
  });
  const many = count === 1 ? 'this building' : `these ${count} buildings`;
  return (
    <ConfirmDialog
      open
      title={`Remove ${many}?`}
      doIt="Remove"
      busy={removal.isPending}
      onConfirm={() => {
        removal.mutate();
      }}
      onClose={onClose}
    >
      <MutationError failed="Nothing was removed." error={removal.error} />
      <p>
        {count === 1 ? 'It goes' : 'They go'} from the register and the plan. The history stays, and
        it can be undone.
      </p>
    </ConfirmDialog>
  );
}
