import { COLUMN_FACTS } from '../../shared/schemas/column-facts.ts';
import type { RegisterColumn } from '../../shared/schemas/register.ts';
import type { ListedBuilding } from '../presenters/building-values.ts';
import { headingWith, type ExportColumn, type ExportValue } from './export-file.ts';

/** What stands over a column, with its unit. */
export function headingOf(column: RegisterColumn): string {
  return headingWith(COLUMN_FACTS[column]);
}

/** A column of the register in a file; an area to the square decimetre. */
export function exportedColumn(column: RegisterColumn): ExportColumn<ListedBuilding> {
  const valueOf = (building: ListedBuilding): ExportValue =>
    column === 'area' ? Math.round(building.area * 100) / 100 : building[column];
  return {
    name: column,
    heading: headingOf(column),
    kind: COLUMN_FACTS[column].kind,
    cell: valueOf,
    property: valueOf,
  };
}
