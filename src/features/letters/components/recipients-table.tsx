import { useState } from 'react';
import { capital } from '../../../../shared/presentation/capital.ts';
import type { BatchPreview, Recipients } from '../../../../shared/schemas/letter-batches.ts';
import { Button } from '../../../components/ui/button.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { earlierWords, reasonWords } from '../letter-words.ts';
import { LeaveOutDialog } from './leave-out-dialog.tsx';

type Recipient = Recipients['recipients'][number];

type RecipientsTableProps = {
  readonly found: Recipients;
  readonly asked: BatchPreview;
  readonly onChange: (asked: BatchPreview) => void;
};

function becauseWords({ reasons, leftOut }: Recipient): string {
  return leftOut === null ? reasonWords(reasons) : `Left out: ${leftOut}`;
}

const HAD: Column<Recipient> = {
  id: 'had',
  heading: 'Had this letter',
  width: 250,
  sortBy: ({ earlier }) => earlierWords(earlier),
  cell: ({ earlier }) => <span title={earlierWords(earlier)}>{earlierWords(earlier)}</span>,
};

function columnsOf(
  hadAny: boolean,
  onLeaveOut: (one: Recipient) => void,
  onTakeIn: (one: Recipient) => void,
): readonly Column<Recipient>[] {
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
    ...(hadAny ? [HAD] : []),
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
  ];
}

/** Who gets a letter, each with the reason; any of them can be left out with another. */
export function RecipientsTable({ found, asked, onChange }: RecipientsTableProps) {
  const [leaving, setLeaving] = useState<Recipient>();
  function without(list: BatchPreview['leftOut'], { partyId }: Recipient) {
    return list.filter((one) => one.partyId !== partyId);
  }
  const isChosen = (one: Recipient) => asked.chosen.some(({ partyId }) => partyId === one.partyId);
  const columns = columnsOf(
    found.recipients.some(({ earlier }) => earlier.length > 0),
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
      <LeaveOutDialog
        whom={leaving === undefined ? null : leaving.name}
        onKeep={(why) => {
          if (leaving === undefined) return;
          onChange({
            ...asked,
            leftOut: [...asked.leftOut, { partyId: leaving.partyId, why }],
          });
          close();
        }}
        onClose={close}
      />
    </>
  );
}
