import { useId } from 'react';
import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { INPUT_STYLE } from '../../../components/ui/field-frame.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { classNames } from '../../../lib/class-names.ts';
import { fieldWords, type ImportField } from '../field-words.ts';

type ColumnLineProps = {
  readonly field: ImportField;
  readonly columns: ImportAnswer['columns'];
  readonly rows: number | null;
  readonly value: string;
  readonly onChange: (column: string) => void;
};

function Filled({ filled, rows }: { readonly filled: number; readonly rows: number | null }) {
  if (rows === null) return `${formatCount(filled)} filled`;
  if (filled >= rows) return 'every row filled';
  return `${formatCount(filled)} of ${formatCount(rows)} filled`;
}

/** One field of the register, the column that fills it, and what stands in there. */
export function ColumnLine({ field, columns, rows, value, onChange }: ColumnLineProps) {
  const id = useId();
  const { label, unit } = fieldWords(field);
  const column = columns.find(({ name }) => name === value);
  return (
    <li className="grid min-h-8 grid-cols-[150px_190px_minmax(0,1fr)] items-center gap-x-3 border-b border-hairline py-0.5 text-small max-sm:grid-cols-[minmax(0,1fr)_minmax(0,1.3fr)] max-sm:py-1.5">
      <label htmlFor={id} className="min-w-0">
        {label}
        {unit !== undefined && <span className="text-ink-3">, {unit}</span>}
      </label>
      <select
        id={id}
        value={column === undefined ? '' : value}
        onChange={({ target }) => {
          onChange(target.value);
        }}
        aria-describedby={column === undefined ? undefined : `${id}-holds`}
        className={classNames(
          INPUT_STYLE,
          'h-7 pr-1 text-small max-sm:h-11',
          column === undefined && 'text-ink-3',
        )}
      >
        <option value="">Not in the file</option>
        {columns.map(({ name }) => (
          <option key={name} value={name}>
            {name}
          </option>
        ))}
      </select>
      {column !== undefined && (
        <p
          id={`${id}-holds`}
          className="min-w-0 truncate text-cap text-ink-2 max-sm:col-span-2 max-sm:mt-0.5"
          title={column.samples.join(' · ')}
        >
          <span className="text-ink-3">
            <Filled filled={column.filled} rows={rows} />
            {column.samples.length > 0 && ': '}
          </span>
          {column.samples.join(' · ')}
        </p>
      )}
    </li>
  );
}
