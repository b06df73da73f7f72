import type {
  RegisterColumn,
  RegisterRow,
  RegisterSort,
} from '../../../../shared/schemas/register.ts';
import { isResultColumn } from '../../../../shared/schemas/result-columns.ts';
import { isStandingColumn } from '../../../../shared/schemas/standing-columns.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { Shown } from '../../buildings/components/shown.tsx';
import { factsOf } from '../../../../shared/presentation/field-words.ts';
import { shownValue } from '../../../../shared/presentation/shown-value.ts';
import type { Marks } from '../hooks/use-marks.ts';
import { SHORT_HEADINGS, UNDER_HEADINGS, WIDTHS } from '../register-columns.ts';
import { StandingCell } from '../../decisions/components/standing-cell.tsx';
import { ResultCell } from './result-cell.tsx';
import { TickBox } from './tick-box.tsx';

const TICK_WIDTH = 44;
const BUILDING_WIDTH = 210;

function tickColumn(marks: Marks, found: number): Column<RegisterRow> {
  return {
    id: 'mark',
    width: TICK_WIDTH,
    heading: (
      <TickBox
        name={`Mark all ${formatCount(found)} found`}
        checked={marks.isAll && marks.letGo === 0}
        mixed={marks.count > 0 && (!marks.isAll || marks.letGo > 0)}
        onToggle={marks.toggleAll}
      />
    ),
    cell: ({ id, reference }) => (
      <TickBox
        name={`Mark ${reference}`}
        checked={marks.isMarked(id)}
        onToggle={() => {
          marks.toggle(id);
        }}
      />
    ),
  };
}

function referenceColumn(needed: number, stuckAt: number | undefined): Column<RegisterRow> {
  return {
    id: 'reference',
    heading: SHORT_HEADINGS.reference,
    width: needed + (stuckAt === undefined ? 12 : 0),
    ...(stuckAt !== undefined && { stuckAt }),
    cell: ({ reference }) => (
      <span title={reference} className="text-ink-2">
        {reference}
      </span>
    ),
  };
}

/** The name of a building, or else its address, and what it is used for. */
function Building({ row }: { readonly row: RegisterRow }) {
  const name = row.name ?? row.address;
  const use = row.use ?? '';
  return (
    <span title={[row.name, row.address, row.use].filter((part) => part !== null).join(', ')}>
      {name === null ? (
        <span className="text-ink-3">no address</span>
      ) : (
        <b className="font-semibold">{name}</b>
      )}{' '}
      <span className="text-ink-2">{use}</span>
    </span>
  );
}

/** Few have a name, so that these are ordered by address, and say so. */
function buildingColumn(sort: RegisterSort): Column<RegisterRow> {
  return {
    id: 'building',
    heading: 'Building',
    wide: true,
    width: BUILDING_WIDTH,
    ...(sort.column === 'address' && { unit: 'by address' }),
    cell: (row) => <Building row={row} />,
  };
}

function cellOf(column: RegisterColumn): Column<RegisterRow>['cell'] {
  if (isStandingColumn(column)) return (row) => <StandingCell column={column} row={row} />;
  if (isResultColumn(column)) return (row) => <ResultCell column={column} row={row} />;
  return (row) => <Shown shown={shownValue(column, row)} />;
}

function fieldColumn(column: RegisterColumn): Column<RegisterRow> {
  const { label, kind, unit = UNDER_HEADINGS[column] } = factsOf(column);
  return {
    id: column,
    heading: SHORT_HEADINGS[column] ?? label,
    width: WIDTHS[column],
    ...(kind !== 'text' && { holds: 'figure' }),
    ...(unit !== undefined && { unit }),
    cell: cellOf(column),
  };
}

/** The columns of the register's table; without marks for who only reads. */
export function registerColumns(
  chosen: readonly RegisterColumn[],
  marks: Marks | null,
  found: number,
  sort: RegisterSort,
  widthOfReference: number,
): readonly Column<RegisterRow>[] {
  return [
    ...(marks === null ? [] : [tickColumn(marks, found)]),
    referenceColumn(widthOfReference, marks === null ? undefined : TICK_WIDTH),
    buildingColumn(sort),
    ...chosen.map(fieldColumn),
  ];
}
