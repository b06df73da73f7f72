import { BUILDING_FIELD_NAMES } from '../../shared/schemas/building-fields.ts';
import {
  REGISTER_COLUMNS,
  type RegisterColumn,
  type RegisterField,
} from '../../shared/schemas/register.ts';
import { isResultColumn } from '../../shared/schemas/result-columns.ts';
import { isStandingColumn } from '../../shared/schemas/standing-columns.ts';
import { BUILDING_COLUMNS, type BuildingColumn } from './building-columns.ts';
import { BESIDE_SELECTION, resultColumn, standingColumn } from './columns-beside.ts';

/** Where each field of the register is kept, of a building or of what was found of it. */
export function registerField(field: RegisterField): BuildingColumn {
  if (isStandingColumn(field)) return standingColumn(field);
  return isResultColumn(field) ? resultColumn(field) : BUILDING_COLUMNS[field];
}

/** Where each column of the register is kept: a closed list, so that no word of a request is SQL. */
export function registerColumn(column: RegisterColumn): BuildingColumn {
  if (column === 'reference') return { name: 'reference', type: 'text' };
  if (column === 'area') return { name: 'area', type: 'double precision' };
  return registerField(column);
}

/** The columns that hold numbers, which ranges are asked of. */
export const NUMBER_COLUMNS: ReadonlySet<RegisterColumn> = new Set(
  REGISTER_COLUMNS.filter((column) => registerColumn(column).type !== 'text'),
);

/** What lists show of a building, called as its presenter wants it. */
export const LISTED = [
  'id',
  'reference',
  'version',
  'area',
  'ground_level_from as "groundLevelFrom"',
  ...['west', 'south', 'east', 'north'],
  ...BUILDING_FIELD_NAMES.map((field) => `${BUILDING_COLUMNS[field].name} as "${field}"`),
  BESIDE_SELECTION,
].join(', ');
