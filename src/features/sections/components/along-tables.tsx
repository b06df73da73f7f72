import type { LongSectionRow } from '../../../../shared/assessment/long-section.ts';
import type { SettlementOnLine } from '../../../../shared/assessment/settlement-along.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { chainageWords } from '../../../../shared/presentation/chainage-words.ts';
import { metres } from '../section-words.ts';
import { SETTLEMENT_COLUMNS, thinned } from './settlement-columns.tsx';

const CHAINAGE: Column<{ readonly chainage: number }> = {
  id: 'chainage',
  heading: 'Chainage',
  holds: 'figure',
  cell: ({ chainage }) => chainageWords(chainage),
};

const LEVEL_COLUMNS: readonly Column<LongSectionRow>[] = [
  CHAINAGE,
  ...(['ground', 'crown', 'axis', 'invert'] as const).map((of): Column<LongSectionRow> => ({
    id: of,
    heading: of.charAt(0).toUpperCase() + of.slice(1),
    unit: 'm',
    holds: 'figure',
    cell: (row) => metres(row[of], 2),
  })),
];

const SETTLEMENT: readonly Column<SettlementOnLine>[] = [CHAINAGE, ...SETTLEMENT_COLUMNS];

type AlongTablesProps = {
  readonly rows: readonly LongSectionRow[];
  readonly settlements: readonly SettlementOnLine[];
  readonly height: number;
};

/** A section along the line in figures: its levels, and settlement over it. */
export function AlongTables({ rows, settlements, height }: AlongTablesProps) {
  return (
    <div style={{ height }} className="flex gap-8 overflow-auto bg-paper px-4 print:h-auto!">
      <Table
        label="Levels along the line"
        columns={LEVEL_COLUMNS}
        rows={rows}
        idOf={({ chainage }) => String(chainage)}
      />
      {settlements.length > 0 && (
        <Table
          label="Settlement along the line"
          columns={SETTLEMENT}
          rows={thinned(settlements)}
          idOf={({ chainage }) => String(chainage)}
        />
      )}
    </div>
  );
}
