import type { TroughOfSection } from '../../../../shared/assessment/trough-of-section.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import { Table } from '../../../components/ui/table/table.tsx';
import type { ShownBuilding, ShownRun } from '../shown-categories.ts';
import { metres, millimetres } from '../section-words.ts';
import { SETTLEMENT_COLUMNS, thinned, type WithSettlement } from './settlement-columns.tsx';

type Point = WithSettlement & { readonly offset: number };

const POINT_COLUMNS: readonly Column<Point>[] = [
  {
    id: 'offset',
    heading: 'Offset to the left',
    unit: 'm',
    holds: 'figure',
    cell: ({ offset }) => metres(offset, 1),
  },
  ...SETTLEMENT_COLUMNS,
];

const BUILDING_COLUMNS: readonly Column<ShownBuilding>[] = [
  { id: 'reference', heading: 'Building', cell: ({ reference }) => reference },
  { id: 'from', heading: 'From', unit: 'm', holds: 'figure', cell: ({ from }) => metres(from, 1) },
  { id: 'to', heading: 'To', unit: 'm', holds: 'figure', cell: ({ to }) => metres(to, 1) },
  {
    id: 'eaves',
    heading: 'Eaves',
    unit: 'm',
    holds: 'figure',
    cell: ({ eavesHeight, isHeightAssumed }) =>
      `${metres(eavesHeight, 1)}${isHeightAssumed ? ', assumed' : ''}`,
  },
];

/** The category that the map shows, under the name of the value at which it does. */
function categoryColumn({ end }: ShownRun): Column<ShownBuilding> {
  return {
    id: 'category',
    heading: 'Category',
    unit: end,
    cell: ({ category }) => (category === null ? '–' : <DamageChip category={category} />),
  };
}

function columnsOf(shown: ShownRun): readonly Column<ShownBuilding>[] {
  return shown.shading?.by === 'category'
    ? [...BUILDING_COLUMNS, categoryColumn(shown)]
    : BUILDING_COLUMNS;
}

type AcrossTablesProps = {
  readonly trough: TroughOfSection;
  readonly buildings: readonly ShownBuilding[];
  readonly shown: ShownRun;
  readonly halfWidth: number;
  readonly height: number;
};

/** A section across the line in figures: its trough, and the buildings that stand on it. */
export function AcrossTables({ trough, buildings, shown, halfWidth, height }: AcrossTablesProps) {
  const points = trough.section.points.filter(({ offset }) => Math.abs(offset) <= halfWidth);
  return (
    <div style={{ height }} className="flex gap-8 overflow-auto bg-paper px-4 print:h-auto!">
      <Table
        label={`Settlement across the line, largest ${trough.largest === null ? 'not known' : `${millimetres(trough.largest.central)} mm`}`}
        columns={POINT_COLUMNS}
        rows={thinned(points, (points.length - 1) / 2).toReversed()}
        idOf={({ offset }) => String(offset)}
      />
      {buildings.length > 0 && (
        <Table
          label="Buildings on the section"
          columns={columnsOf(shown)}
          rows={buildings.toReversed()}
          idOf={({ id, from }) => `${id} ${from}`}
        />
      )}
    </div>
  );
}
