import type { OpenedWall } from '../../../../shared/assessment/open-wall.ts';
import type { WorkingSection } from '../../../../shared/assessment/working-of-wall.ts';
import type { WorkingLine } from '../../../../shared/working.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { percentFromRatio } from '../../../../shared/units/percent-from-ratio.ts';
import { classNames } from '../../../lib/class-names.ts';
import { WorkingPopover } from './working-popover.tsx';

type Row = {
  readonly index: number;
  readonly governs: boolean;
  readonly zone: OpenedWall['result']['zones'][number];
  readonly lines: readonly WorkingLine[];
};

function rowsOf({ result, working }: Pick<OpenedWall, 'result' | 'working'>): Row[] {
  const ofZones = working.filter(({ title }) => title.startsWith('Zone '));
  return result.zones.map((zone, index) => ({
    index,
    governs: index === result.governingZone,
    zone,
    lines: linesOf(ofZones[index]),
  }));
}

function linesOf(section: WorkingSection | undefined): readonly WorkingLine[] {
  return section?.lines ?? [];
}

function percent(ratio: number, digits: number): string {
  return percentFromRatio(ratio).toFixed(digits).replace('-', '\u2212');
}

/** A figure that opens the lines of its zone with these symbols. */
function opens(row: Row, name: string, figure: string, symbols: readonly string[]) {
  const chosen = row.lines.filter(({ symbol }) => symbols.includes(symbol));
  const first = row.lines.findIndex(({ symbol }) => symbols.includes(symbol));
  return (
    <WorkingPopover
      title={`${name} of zone ${row.index + 1}`}
      lines={chosen}
      before={row.lines.slice(0, Math.max(0, first))}
    >
      {figure}
    </WorkingPopover>
  );
}

const COLUMNS: readonly Column<Row>[] = [
  {
    id: 'zone',
    heading: <span className="pl-2">Zone</span>,
    cell: ({ index, governs, zone }) => (
      <span className={classNames('pl-2', governs && 'font-semibold text-clay-deep')}>
        {index + 1} {zone.mode}
        {governs && <span className="sr-only">, governs</span>}
      </span>
    ),
  },
  {
    id: 'from',
    heading: 'From',
    unit: 'm',
    holds: 'figure',
    cell: ({ zone }) => zone.start.toFixed(1),
  },
  { id: 'to', heading: 'To', unit: 'm', holds: 'figure', cell: ({ zone }) => zone.end.toFixed(1) },
  {
    id: 'ratio',
    heading: 'Δ/L',
    unit: '%',
    holds: 'figure',
    cell: (row) =>
      opens(row, 'deflection ratio', percent(row.zone.deflectionRatio, 4), ['Δ', 'DL']),
  },
  {
    id: 'horizontal',
    heading: (
      <>
        ε<sub>h</sub>
      </>
    ),
    unit: '%',
    holds: 'figure',
    cell: (row) =>
      opens(row, 'horizontal strain', percent(row.zone.horizontalStrain, 4), [
        'ε_avg',
        'ε_peak',
        'ε_h',
      ]),
  },
  {
    id: 'bending',
    heading: 'Bending',
    unit: '%',
    holds: 'figure',
    spare: true,
    cell: (row) =>
      opens(row, 'bending strain', percent(row.zone.bendingStrain, 4), ['I', 't', 'r_b', 'ε_bt']),
  },
  {
    id: 'diagonal',
    heading: 'Diagonal',
    unit: '%',
    holds: 'figure',
    spare: true,
    cell: (row) =>
      opens(row, 'diagonal strain', percent(row.zone.diagonalStrain, 4), ['I', 'r_d', 'ε_dt']),
  },
  {
    id: 'strain',
    heading: 'Strain',
    unit: '%',
    holds: 'figure',
    cell: (row) => opens(row, 'strain', percent(row.zone.strain, 4), ['ε_bt', 'ε_dt', 'ε']),
  },
];

/** The zones of a wall with their strains; each figure opens its working. */
export function ZonesTable({
  opened,
}: {
  readonly opened: Pick<OpenedWall, 'result' | 'working'>;
}) {
  return (
    <Table
      label="Zones of the wall"
      columns={COLUMNS}
      rows={rowsOf(opened)}
      idOf={({ index }) => String(index)}
    />
  );
}
