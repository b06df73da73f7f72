import type { Sequelize, Transaction } from 'sequelize';
import type { PlacedFootprint } from '../importers/placed-footprint.ts';
import type { Building } from './building.ts';

export type BuildingAttributes = Pick<
  Building,
  | 'name'
  | 'address'
  | 'use'
  | 'storeys'
  | 'eavesHeight'
  | 'groundLevel'
  | 'foundingLevel'
  | 'foundation'
  | 'construction'
  | 'listedGrade'
  | 'condition'
>;

export type BuildingRow = PlacedFootprint & {
  readonly reference: string;
  /** What is left out is unknown. */
  readonly attributes: Partial<BuildingAttributes>;
};

type Column = readonly [name: string, type: string, value: (row: BuildingRow) => unknown];

function attribute(name: string, type: string, key: keyof BuildingAttributes): Column {
  return [name, type, ({ attributes }) => attributes[key] ?? null];
}

const COLUMNS: readonly Column[] = [
  ['reference', 'text', ({ reference }) => reference],
  attribute('name', 'text', 'name'),
  attribute('address', 'text', 'address'),
  attribute('use', 'text', 'use'),
  attribute('storeys', 'integer', 'storeys'),
  attribute('eaves_height', 'double precision', 'eavesHeight'),
  attribute('ground_level', 'double precision', 'groundLevel'),
  attribute('founding_level', 'double precision', 'foundingLevel'),
  attribute('foundation', 'text', 'foundation'),
  attribute('construction', 'text', 'construction'),
  attribute('listed_grade', 'text', 'listedGrade'),
  attribute('condition', 'text', 'condition'),
  ['footprint', 'jsonb', ({ footprint }) => JSON.stringify(footprint)],
  ['lon_lat', 'jsonb', ({ lonLat }) => JSON.stringify(lonLat)],
  ['west', 'double precision', ({ bounds }) => bounds.west],
  ['south', 'double precision', ({ bounds }) => bounds.south],
  ['east', 'double precision', ({ bounds }) => bounds.east],
  ['north', 'double precision', ({ bounds }) => bounds.north],
];

const NAMES = COLUMNS.map(([name]) => name).join(', ');
const LISTS = COLUMNS.map(([, type], index) => `$${index + 2}::${type}[]`).join(', ');

/** Inserts buildings of a scheme by the column, which is many times faster than by the row. */
export async function insertBuildingRows(
  database: Sequelize,
  schemeId: string,
  rows: readonly BuildingRow[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into buildings (scheme_id, ${NAMES})
     select $1, given.* from unnest(${LISTS}) as given`,
    { bind: [schemeId, ...COLUMNS.map(([, , value]) => rows.map(value))], transaction },
  );
}
