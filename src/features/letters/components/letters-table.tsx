import { useState } from 'react';
import { capital } from '../../../../shared/presentation/capital.ts';
import type { BatchDetail } from '../../../../shared/schemas/letter-batches.ts';
import type { EarlierLetter, ListedLetter } from '../../../../shared/schemas/letters.ts';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { formatShortDay } from '../../../lib/format-date.ts';
import { DELIVERY_SHAPES, earlierWords } from '../letter-words.ts';
import { LetterDialog } from './letter-dialog.tsx';

function day(at: string | null): string {
  return at === null ? '' : formatShortDay(at);
}

const COLUMNS: readonly Column<ListedLetter>[] = [
  {
    id: 'number',
    heading: 'Letter',
    width: 72,
    sortBy: ({ batchNumber, number }) => batchNumber * 100_000 + number,
    cell: ({ batchNumber, number }) => `${batchNumber}-${number}`,
  },
  {
    id: 'name',
    heading: 'To',
    wide: true,
    sortBy: ({ name }) => name,
    cell: ({ name }) => (name === '' ? 'Personal data erased' : name),
  },
  {
    id: 'channel',
    heading: 'By',
    width: 72,
    spare: true,
    sortBy: ({ channel }) => channel,
    cell: ({ channel }) => capital(channel),
  },
  {
    id: 'delivery',
    heading: 'Stands',
    width: 190,
    sortBy: ({ delivery }) => delivery,
    cell: ({ delivery }) => (
      <StateMark state={DELIVERY_SHAPES[delivery]}>{capital(delivery)}</StateMark>
    ),
  },
  {
    id: 'answerBy',
    heading: 'Answer by',
    width: 110,
    spare: true,
    sortBy: ({ answerBy }) => answerBy ?? '',
    cell: ({ answerBy }) => day(answerBy),
  },
  {
    id: 'reminded',
    heading: 'Reminded',
    width: 110,
    spare: true,
    sortBy: ({ remindedAt }) => remindedAt ?? '',
    cell: ({ remindedAt }) => day(remindedAt),
  },
  {
    id: 'acknowledged',
    heading: 'Acknowledged',
    width: 120,
    spare: true,
    sortBy: ({ acknowledgedAt }) => acknowledgedAt ?? '',
    cell: ({ acknowledgedAt }) => day(acknowledgedAt),
  },
];

/** What whoever gets the letter had already, by letter. */
function hadColumn(had: ReadonlyMap<string, readonly EarlierLetter[]>): Column<ListedLetter> {
  const words = ({ id }: ListedLetter) => earlierWords(had.get(id) ?? []);
  return {
    id: 'had',
    heading: 'Had such a letter',
    width: 250,
    sortBy: words,
    cell: (letter) => <span title={words(letter)}>{words(letter)}</span>,
  };
}

type LettersTableProps = {
  readonly label: string;
  readonly letters: readonly ListedLetter[];
  /** Which of them go to somebody who had one like it. */
  readonly earlier?: BatchDetail['earlier'];
};

/** Letters, each of which opens. */
export function LettersTable({ label, letters, earlier = [] }: LettersTableProps) {
  const [open, setOpen] = useState<string>();
  const had = new Map(earlier.map((one) => [one.letterId, one.had]));
  const columns = had.size === 0 ? COLUMNS : COLUMNS.toSpliced(2, 0, hadColumn(had));
  return (
    <>
      <Table
        label={label}
        columns={columns}
        rows={letters}
        idOf={({ id }) => id}
        onOpen={({ id }) => {
          setOpen(id);
        }}
      />
      {open !== undefined && (
        <LetterDialog
          letterId={open}
          onClose={() => {
            setOpen(undefined);
          }}
        />
      )}
    </>
  );
}
