import type { ImportOptions, ImportRow } from '../../../../shared/schemas/imports.ts';
import { fieldWords } from '../field-words.ts';
import { changeWords, standingOf, valueWords } from '../row-words.ts';

const CELL = 'border-b border-hairline py-1 pr-3 align-top break-words whitespace-normal';
const HEAD = `${CELL} font-normal`;

type RowChangesProps = { readonly row: ImportRow; readonly settle: ImportOptions['settle'] };

function weight(stands: boolean): string {
  return `${CELL} ${stands ? 'font-semibold' : 'text-ink-2'}`;
}

/** Which values of a row change: as they are here and in the file; the one that will stand is strong. */
export function RowChanges({ row, settle }: RowChangesProps) {
  const way = settle.rows[row.reference ?? ''] ?? settle.others;
  return (
    <table
      aria-label={`Values of ${row.reference ?? `row ${row.row}`}`}
      className="w-full table-fixed text-small"
    >
      <thead>
        <tr className="text-left text-cap text-ink-3">
          <th scope="col" className={`${HEAD} w-[27%]`}>
            Field
          </th>
          <th scope="col" className={HEAD}>
            Here
          </th>
          <th scope="col" className={HEAD}>
            In the file
          </th>
          <th scope="col" className={HEAD}>
            <span className="sr-only">What it comes to</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {row.changes.map((change) => {
          const { label, unit } = fieldWords(change.field);
          const stands = standingOf(change, way);
          return (
            <tr key={change.field}>
              <th scope="row" className={`${CELL} text-left font-normal text-ink-2`}>
                {label}
                {unit !== undefined && `, ${unit}`}
              </th>
              <td className={weight(stands === 'ours')}>{valueWords(change.ours, change.field)}</td>
              <td className={weight(stands === 'theirs')}>
                {valueWords(change.theirs, change.field)}
              </td>
              <td className={`${CELL} text-ink-2`}>{changeWords(change, way)}</td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
