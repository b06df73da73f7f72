import type { ImportAnswer, ImportRow } from '../../../../shared/schemas/imports.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { OUTCOME_WORDS } from '../outcomes.ts';
import { reasonOf } from '../row-words.ts';
import { OutcomeSwatch } from './outcome-swatch.tsx';

/** In whole square metres, but for what is smaller than a shed. */
function areaOf(area: number): number {
  return area < 10 ? Math.round(area * 10) / 10 : Math.round(area);
}

const AREA: Column<ImportRow> = {
  id: 'area',
  heading: 'Area',
  unit: 'm²',
  holds: 'figure',
  spare: true,
  cell: ({ area }) => (area === null ? '' : formatCount(areaOf(area))),
};

/** What a line of the report shows; files without footprints have no areas. */
export function reportColumns(kind: ImportAnswer['kind']): readonly Column<ImportRow>[] {
  return [
    { id: 'row', heading: 'Row', holds: 'figure', cell: ({ row }) => formatCount(row) },
    {
      id: 'reference',
      heading: 'Reference',
      cell: ({ reference }) => <b className="font-semibold">{reference ?? '–'}</b>,
    },
    {
      id: 'outcome',
      heading: 'What becomes of it',
      cell: ({ outcome }) => (
        <span className="inline-flex items-center gap-1.5 align-middle">
          <OutcomeSwatch outcome={outcome} />
          {OUTCOME_WORDS[outcome].one}
        </span>
      ),
    },
    ...(kind === 'values' ? [] : [AREA]),
    { id: 'why', heading: 'Why', wide: true, cell: reasonOf },
  ];
}
