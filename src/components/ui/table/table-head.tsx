import { classNames } from '../../../lib/class-names.ts';
import { columnStyle, stuckStyle, type Column } from './column.ts';
import type { Ordering } from './ordering.ts';

type Direction = 'asc' | 'desc';

const ARIA_SORT = { asc: 'ascending', desc: 'descending' } as const;

function SortMark({ direction }: { readonly direction: Direction }) {
  return (
    <svg width="7" height="5" aria-hidden="true" className="mb-0.5 ml-1 inline-block fill-ink">
      <path d={direction === 'asc' ? 'M0 5 3.5 0 7 5z' : 'M0 0 3.5 5 7 0z'} />
    </svg>
  );
}

type HeadingProps<T> = { readonly column: Column<T>; readonly ordering: Ordering };

function Heading<T>({ column, ordering }: HeadingProps<T>) {
  const sorted = ordering.directionOf(column.id);
  const words = (
    <>
      <span>
        {column.heading}
        {sorted !== undefined && <SortMark direction={sorted} />}
      </span>{' '}
      {column.unit !== undefined && (
        <small className="block text-micro font-normal text-ink-3">{column.unit}</small>
      )}
    </>
  );
  return (
    <th
      scope="col"
      aria-sort={sorted === undefined ? undefined : ARIA_SORT[sorted]}
      style={stuckStyle(column)}
      className={classNames(
        'sticky top-0 border-b border-rule bg-paper px-2 pt-1.5 pb-[5px] align-bottom text-cap',
        'leading-tight font-semibold whitespace-nowrap first:left-0 first:z-20 print:static',
        column.stuckAt === undefined ? 'z-10' : 'z-20',
        columnStyle(column),
      )}
    >
      {ordering.canSort(column.id) ? (
        <button
          type="button"
          className={classNames(
            'inline-flex min-h-6 flex-col justify-end text-inherit hover:text-clay-deep max-sm:min-h-9 print:contents',
            column.holds === 'figure' ? 'items-end' : 'items-start',
          )}
          onClick={() => {
            ordering.sortBy(column.id);
          }}
        >
          {words}
        </button>
      ) : (
        words
      )}
    </th>
  );
}

/** The headings, at the foot of their cells, each with its unit and how the table is sorted by it. */
export function TableHead<T>({
  columns,
  ordering,
}: {
  readonly columns: readonly Column<T>[];
  readonly ordering: Ordering;
}) {
  return (
    <thead>
      <tr>
        {columns.map((column) => (
          <Heading key={column.id} column={column} ordering={ordering} />
        ))}
      </tr>
    </thead>
  );
}
