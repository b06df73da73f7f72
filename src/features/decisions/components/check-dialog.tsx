import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { useCheckDecisions } from '../api/check-decisions.ts';
import { waitingDecisionsQuery } from '../api/waiting-decisions.ts';
import { useWithdrawDecisions } from '../api/withdraw-decisions.ts';
import { CheckButtons } from './check-buttons.tsx';
import { WaitingFacts } from './waiting-facts.tsx';

type CheckDialogProps = {
  readonly schemeId: string;
  readonly marks: { readonly filter: RegisterFilter; readonly count: number };
  readonly onClose: () => void;
  readonly onDone: (words: string) => void;
};

/** Checks or returns what waits on all buildings that are marked, after a look at what that is. */
export function CheckDialog({ schemeId, marks, onClose, onDone }: CheckDialogProps) {
  // what was marked when it was opened
  const [{ filter, count }] = useState(marks);
  const [comment, setComment] = useState('');
  const { data: waiting, error } = useQuery(waitingDecisionsQuery(schemeId, filter));
  const { may = 0, own = 0 } = waiting ?? {};
  const [verdict, setVerdict] = useState<'checked' | 'returned'>('checked');
  function close(words: string) {
    onDone(words);
    onClose();
  }
  const check = useCheckDecisions(schemeId, () => {
    close(`${formatCount(may)} ${verdict}.`);
  });
  const withdraw = useWithdrawDecisions(schemeId, () => {
    close(`${formatCount(own)} withdrawn.`);
  });
  const busy = check.isPending || withdraw.isPending;

  function settle(given: 'checked' | 'returned') {
    setVerdict(given);
    check.mutate({ filter, verdict: given, comment, expected: may });
  }
  return (
    <Dialog open title={`Check ${formatCount(count)} marked`} onClose={onClose}>
      <div className="grid gap-3">
        <MutationError failed="What waits could not be fetched." error={error} />
        <MutationError failed="Nothing was changed." error={check.error ?? withdraw.error} />
        {waiting !== undefined && <WaitingFacts waiting={waiting} />}
        <TextArea
          label="Comment"
          hint="Needed to return; kept with each decision."
          rows={2}
          value={comment}
          onChange={({ target }) => {
            setComment(target.value);
          }}
        />
        <CheckButtons
          {...{ may, own, busy }}
          mayReturn={comment.trim() !== ''}
          onSettle={settle}
          onWithdraw={() => {
            withdraw.mutate({ filter, expected: own });
          }}
        />
      </div>
    </Dialog>
  );
}
