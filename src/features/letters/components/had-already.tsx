import { useState } from 'react';
import type { BatchPreview, Recipients } from '../../../../shared/schemas/letter-batches.ts';
import { Button } from '../../../components/ui/button.tsx';
import { LeaveOutDialog } from './leave-out-dialog.tsx';

type HadAlreadyProps = {
  readonly found: Recipients;
  readonly asked: BatchPreview;
  readonly onChange: (asked: BatchPreview) => void;
};

const MOST_NAMED = 3;

function namesOf(some: Recipients['recipients']): string {
  const named = some.slice(0, MOST_NAMED).map(({ name }) => name);
  const more = some.length - named.length;
  return `${named.join(', ')}${more > 0 ? ` and ${more.toLocaleString('en-GB')} more` : ''}`;
}

/** How many would get a letter that they had already, or that waits for them; they can be left out at once. */
export function HadAlready({ found, asked, onChange }: HadAlreadyProps) {
  const [asks, setAsks] = useState(false);
  const had = found.recipients.filter(({ earlier, leftOut }) => {
    return earlier.length > 0 && leftOut === null;
  });
  if (had.length === 0) return null;
  const count = had.length.toLocaleString('en-GB');
  const close = () => {
    setAsks(false);
  };
  function leaveOut(why: string) {
    const ids = new Set(had.map(({ partyId }) => partyId));
    const chosen = asked.chosen.filter(({ partyId }) => !ids.has(partyId));
    const byRule = had.filter(({ partyId }) =>
      asked.chosen.every((one) => one.partyId !== partyId),
    );
    const left = byRule.map(({ partyId }) => ({ partyId, why }));
    onChange({ ...asked, chosen, leftOut: [...asked.leftOut, ...left] });
    close();
  }
  return (
    <div className="mt-3 flex flex-wrap items-center gap-x-4 gap-y-2 border-l-4 border-clay pl-3">
      <p className="text-body">
        {`${count} of them had a letter of this kind for the same building, or it waits for them in another batch. The list says which.`}
      </p>
      <Button
        onClick={() => {
          setAsks(true);
        }}
      >
        {`Leave ${had.length === 1 ? 'this one' : `these ${count}`} out…`}
      </Button>
      <LeaveOutDialog
        whom={asks ? namesOf(had) : null}
        begins="Had this letter already."
        onKeep={leaveOut}
        onClose={close}
      />
    </div>
  );
}
