import { useState, type SubmitEvent } from 'react';
import { capital } from '../../../../shared/presentation/capital.ts';
import type { BatchPreview, Recipients } from '../../../../shared/schemas/letter-batches.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Field } from '../../../components/ui/field.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { reasonWords } from '../letter-words.ts';

type Recipient = Recipients['recipients'][number];

type RecipientsTableProps = {
  readonly found: Recipients;
  readonly asked: BatchPreview;
  readonly onChange: (asked: BatchPreview) => void;
};

function becauseWords({ reasons, leftOut }: Recipient): string {
  return leftOut === null ? reasonWords(reasons) : `Left out: ${leftOut}`;
}

function columnsOf(onLeaveOut: (one: Recipient) => void, onTakeIn: (one: Recipient) => void) {
  return [
    {
      id: 'name',
      heading: 'To',
      width: 240,
      sortBy: ({ name }) => name,
      cell: ({ name }) => name,
    },
    {
      id: 'by',
      heading: 'By',
      width: 72,
      sortBy: ({ channel }) => channel,
      cell: ({ channel }) => capital(channel),
    },
    {
      id: 'why',
      heading: 'Because',
      wide: true,
      cell: (one) => <span title={becauseWords(one)}>{becauseWords(one)}</span>,
    },
    {
      id: 'act',
      heading: 'Change',
      width: 110,
      cell: (one) => (
        <Button
          kind="quiet"
          onClick={() => {
            if (one.leftOut === null) onLeaveOut(one);
            else onTakeIn(one);
          }}
        >
          {one.leftOut === null ? 'Leave out…' : 'Take in again'}
        </Button>
      ),
    },
  ] satisfies readonly Column<Recipient>[];
}

function LeaveOut({
  name,
  onKeep,
}: {
  readonly name: string;
  readonly onKeep: (why: string) => void;
}) {
  const [why, setWhy] = useState('');
  function keep(event: SubmitEvent) {
    event.preventDefault();
    if (why.trim() !== '') onKeep(why.trim());
  }
  return (
    <form onSubmit={keep} className="grid gap-3">
      <p className="text-body break-words">{name} gets no letter of this batch.</p>
      <Field
        required
        data-first-in-focus
        label="Why"
        hint="Kept with the batch"
        value={why}
        onChange={(event) => {
          setWhy(event.target.value);
        }}
      />
      <div>
        <Button kind="main" type="submit">
          Leave them out
        </Button>
      </div>
    </form>
  );
}

/** Who gets a letter, each with the reason; any of them can be left out with another. */
export function RecipientsTable({ found, asked, onChange }: RecipientsTableProps) {
  const [leaving, setLeaving] = useState<Recipient>();
  function without(list: BatchPreview['leftOut'], { partyId }: Recipient) {
    return list.filter((one) => one.partyId !== partyId);
  }
  const isChosen = (one: Recipient) => asked.chosen.some(({ partyId }) => partyId === one.partyId);
  const columns = columnsOf(
    (one) => {
      if (isChosen(one)) onChange({ ...asked, chosen: without(asked.chosen, one) });
      else setLeaving(one);
    },
    (one) => {
      onChange({ ...asked, leftOut: without(asked.leftOut, one) });
    },
  );
  function close() {
    setLeaving(undefined);
  }
  return (
    <>
      <Table
        label="Who gets it"
        columns={columns}
        rows={found.recipients}
        idOf={({ partyId }) => partyId}
      />
      <Dialog open={leaving !== undefined} title="Leave somebody out" onClose={close}>
        {leaving !== undefined && (
          <LeaveOut
            name={leaving.name}
            onKeep={(why) => {
              onChange({
                ...asked,
                leftOut: [...asked.leftOut, { partyId: leaving.partyId, why }],
              });
              close();
            }}
          />
        )}
      </Dialog>
    </>
  );
}
