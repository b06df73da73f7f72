import { wallLength } from '../../../../shared/building/wall.ts';
import type { BuildingResult } from '../../../../shared/assessment/assess-building.ts';
import { percentFromRatio } from '../../../../shared/units/percent-from-ratio.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { categoryLabel } from '../../../../shared/presentation/bracket-words.ts';

type Row = {
  readonly index: number;
  readonly isOpen: boolean;
  readonly governs: boolean;
  readonly found: BuildingResult['walls'][number];
};

function percent(ratio: number, digits: number): string {
  return percentFromRatio(ratio).toFixed(digits).replace('-', '\u2212');
}

function governingZone({ found }: Row) {
  return found.result.zones[found.result.governingZone];
}

function figure(id: string, heading: string, unit: string, cell: (row: Row) => string) {
  return { id, heading, unit, holds: 'figure', cell } as const satisfies Column<Row>;
}

const COLUMNS: readonly Column<Row>[] = [
  {
    id: 'wall',
    heading: 'Wall',
    cell: ({ found, governs, isOpen }) => (
      <span className={isOpen ? 'font-semibold text-clay-deep' : ''}>
        {found.wall.name}
        {governs && <span className="text-ink-2"> governs</span>}
      </span>
    ),
  },
  figure('length', 'Length', 'm', ({ found }) => wallLength(found.wall).toFixed(1)),
  {
    id: 'mode',
    heading: 'Bends',
    cell: (row) => governingZone(row)?.mode ?? 'not',
  },
  figure('strain', 'Strain', '%', ({ found }) => percent(found.result.strain, 3)),
  figure('category', 'Cat.', '', ({ found }) => categoryLabel(found.result.category)),
];

type WallTableProps = {
  readonly strain: BuildingResult;
  readonly index: number;
  readonly onChoose: (index: number) => void;
};

/** Every wall, alone and in its row; one opens its section. */
export function WallTable({ strain, index, onChoose }: WallTableProps) {
  const rows = strain.walls.map((found, k) => ({
    index: k,
    isOpen: k === index,
    governs: k === strain.governing,
    found,
  }));
  return (
    <div className="mt-2">
      <Table
        label="Walls"
        columns={COLUMNS}
        rows={rows}
        idOf={(row) => String(row.index)}
        onOpen={(row) => {
          onChoose(row.index);
        }}
      />
    </div>
  );
}
