import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { BUILDING_FIELD_NAMES } from '../../shared/schemas/building-fields.ts';
import { BUILDING_COLUMNS, FIELD_SELECTION, type BuildingValues } from './building-columns.ts';
import type { GroundLevelFrom } from './building.ts';

/** What the last file said of a building, by field; of a footprint its hash. */
export type ImportedValues = Readonly<Record<string, string | number | null>>;

/** Everything that the register keeps of a building apart from its footprint. */
export type BuildingState = BuildingValues & {
  readonly reference: string;
  readonly groundLevelFrom: GroundLevelFrom | null;
  readonly imported: ImportedValues;
  readonly area: number;
  readonly west: number;
  readonly south: number;
  readonly east: number;
  readonly north: number;
};

export type KeptBuilding = BuildingState & {
  readonly id: number;
  readonly version: number;
  readonly isRemoved: boolean;
};

type Column = readonly [name: string, type: string, value: (row: BuildingState) => unknown];

/** How a state is written, column by column. */
const COLUMNS: readonly Column[] = [
  ['reference', 'text', ({ reference }) => reference],
  ...BUILDING_FIELD_NAMES.map((field): Column => {
    const { name, type } = BUILDING_COLUMNS[field];
    return [name, type, (row) => row[field]];
  }),
  ['ground_level_from', 'text', ({ groundLevelFrom }) => groundLevelFrom],
  ['imported', 'jsonb', ({ imported }) => JSON.stringify(imported)],
  ...(['area', 'west', 'south', 'east', 'north'] as const).map((name): Column => [
    name,
    'double precision',
    (row) => row[name],
  ]),
];

const NAMES = COLUMNS.map(([name]) => name);

function lists(from: number): string {
  return COLUMNS.map(([, type], index) => `$${from + index}::${type}[]`).join(', ');
}

function values(rows: readonly BuildingState[]): unknown[] {
  return COLUMNS.map(([, , value]) => rows.map(value));
}

/** The states of some buildings of a scheme by their numbers, those taken out too. */
export async function findBuildingStates(
  database: Sequelize,
  schemeId: string,
  ids: readonly number[],
  transaction?: Transaction,
): Promise<Map<number, KeptBuilding>> {
  const rows = await database.query<KeptBuilding>(
    `select id, version, removed_at is not null as "isRemoved", reference, ${FIELD_SELECTION},
       ground_level_from as "groundLevelFrom", imported, area, west, south, east, north
     from buildings where scheme_id = $1 and id = any($2)`,
    { type: QueryTypes.SELECT, bind: [schemeId, ids], transaction: transaction ?? null },
  );
  return new Map(rows.map((row) => [row.id, row]));
}

/** Inserts buildings by the column, which is many times faster than by the row; gives their numbers. */
export async function insertBuildingStates(
  database: Sequelize,
  schemeId: string,
  rows: readonly BuildingState[],
  transaction: Transaction,
): Promise<number[]> {
  const made = await database.query<{ id: number; reference: string }>(
    `insert into buildings (scheme_id, ${NAMES.join(', ')})
     select $1, given.* from unnest(${lists(2)}) as given returning id, reference`,
    { type: QueryTypes.SELECT, bind: [schemeId, ...values(rows)], transaction },
  );
  const numbers = new Map(made.map(({ id, reference }) => [reference, id]));
  return rows.map(({ reference }) => numbers.get(reference) ?? 0);
}

/** Writes buildings anew by their numbers; whoever had seen an older version is told. */
export async function updateBuildingStates(
  database: Sequelize,
  rows: readonly (BuildingState & { readonly id: number; readonly version: number })[],
  transaction: Transaction,
): Promise<void> {
  const sets = NAMES.map((name) => `${name} = given.${name}`).join(', ');
  await database.query(
    `update buildings as kept set ${sets}, version = given.version, removed_at = null
     from unnest($1::integer[], $2::integer[], ${lists(3)})
       as given(id, version, ${NAMES.join(', ')})
     where kept.id = given.id`,
    {
      bind: [rows.map(({ id }) => id), rows.map(({ version }) => version), ...values(rows)],
      transaction,
    },
  );
}

/** Takes buildings out of the register; the rows and their history stay. */
export async function markRemoved(
  database: Sequelize,
  ids: readonly number[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update buildings set removed_at = now(), version = version + 1 where id = any($1)`,
    { bind: [ids], transaction },
  );
}
