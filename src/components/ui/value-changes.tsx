import type { ValueChange } from '../../lib/changes-between.ts';

const CELL = 'border-b border-hairline py-1 pr-4 align-top break-words whitespace-normal';

/** Values beside what became of them. */
export function ValueChanges({
  label,
  changes,
}: {
  readonly label: string;
  readonly changes: readonly ValueChange[];
}) {
  return (
    <table aria-label={label} className="w-full max-w-[860px] table-fixed text-small">
      <thead>
        <tr className="text-left text-cap text-ink-3">
          <th scope="col" className={`${CELL} w-[28%] font-normal`}>
            What
          </th>
          <th scope="col" className={`${CELL} font-normal`}>
            Before
          </th>
          <th scope="col" className={`${CELL} font-normal`}>
            After
          </th>
        </tr>
      </thead>
      <tbody>
        {changes.map(({ path, before, after }) => (
          <tr key={path}>
            <th scope="row" className={`${CELL} text-left font-normal text-ink-2`}>
              {path}
            </th>
            <td className={`${CELL} text-ink-2`}>{before ?? '–'}</td>
            <td className={`${CELL} font-medium`}>{after ?? '–'}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
