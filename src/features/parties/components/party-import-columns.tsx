import { useState } from 'react';
import {
  PARTY_COLUMN_WORDS,
  PARTY_COLUMNS,
  type PartyColumn,
  type PartyColumns,
  type PartyImport,
} from '../../../../shared/schemas/party-imports.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { Select } from '../../../components/ui/select.tsx';

type PartyImportColumnsProps = {
  readonly answer: PartyImport;
  readonly busy: boolean;
  readonly onCheck: (columns: PartyColumns) => void;
};

/** A column fills one thing: chosen anew, it is taken from where it was. */
function withColumn(columns: PartyColumns, field: PartyColumn, column: string): PartyColumns {
  const others = Object.entries(columns).filter(
    ([name, value]) => name !== field && value !== column,
  );
  return Object.fromEntries(column === '' ? others : [...others, [field, column]]);
}

/** Which column of the file holds what; chosen otherwise, the file is checked again. */
export function PartyImportColumns({ answer, busy, onCheck }: PartyImportColumnsProps) {
  const [columns, setColumns] = useState(answer.columns);
  const options = answer.fileColumns.map((name) => ({ value: name, label: name }));
  const isChanged = PARTY_COLUMNS.some((field) => columns[field] !== answer.columns[field]);
  return (
    <Panel title="Which column is what" note="guessed by the headings">
      <div className="mt-2 grid grid-cols-2 gap-x-3 gap-y-2">
        {PARTY_COLUMNS.map((field) => (
          <Select
            key={field}
            label={PARTY_COLUMN_WORDS[field]}
            options={options}
            unchosen="Not in the file"
            value={columns[field] ?? ''}
            onChange={({ target }) => {
              setColumns(withColumn(columns, field, target.value));
            }}
          />
        ))}
      </div>
      <div className="mt-3 flex flex-wrap items-center gap-2">
        <Button
          kind={isChanged ? 'main' : 'plain'}
          busy={busy}
          onClick={() => {
            onCheck(columns);
          }}
        >
          Check again
        </Button>
        {isChanged && (
          <span className="text-small text-ink-2">The report is still by the old columns.</span>
        )}
      </div>
    </Panel>
  );
}
