import { BUILDING_FIELD_NAMES } from '../../shared/schemas/building-fields.ts';
import { REGISTER_COLUMNS, type RegisterColumn } from '../../shared/schemas/register.ts';
import { isResultColumn, RESULT_COLUMNS } from '../../shared/schemas/result-columns.ts';
import { isBesideColumn, type BesideColumn } from '../../shared/schemas/standing-columns.ts';
import { BUILDING_COLUMNS, type BuildingColumn } from './building-columns.ts';
import { BESIDE_SELECTION } from './columns-beside.ts';

/** The columns of the register that are buildings' own. */
export type OwnColumn = Exclude<RegisterColumn, BesideColumn>;

/** These columns, in order. */
export const OWN_COLUMNS: readonly OwnColumn[] = REGISTER_COLUMNS.filter(
  (column) => !isBesideColumn(column),
);

/** An order of the register by what buildings have of their own. */
export type OwnSort = { readonly column: OwnColumn; readonly descending: boolean };

/** Where each own column of the register is kept: a closed list, so that no word of a request is SQL. */
export function ownColumn(column: OwnColumn): BuildingColumn {
  if (column === 'reference') return { name: 'reference', type: 'text' };
  if (column === 'area') return { name: 'area', type: 'double precision' };
  return BUILDING_COLUMNS[column];
}

function isNumber(column: RegisterColumn): boolean {
  if (!isBesideColumn(column)) return ownColumn(column).type !== 'text';
  return isResultColumn(column) && RESULT_COLUMNS[column].kind !== 'text';
}

/** The columns that hold numbers, which ranges are asked of. */
export const NUMBER_COLUMNS: ReadonlySet<RegisterColumn> = new Set(
  REGISTER_COLUMNS.filter(isNumber),
);

/** What lists show of a building `b`, called as its presenter wants it. */
export const LISTED = [
  ...['b.id', 'b.reference', 'b.version', 'b.area'],
  'b.ground_level_from as "groundLevelFrom"',
  ...['b.west', 'b.south', 'b.east', 'b.north'],
  ...BUILDING_FIELD_NAMES.map((field) => `b.${BUILDING_COLUMNS[field].name} as "${field}"`),
  BESIDE_SELECTION,
].join(', ');
