import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { BuildingField } from '../../shared/schemas/building-fields.ts';
import type { ListedBuilding } from '../presenters/building-values.ts';
import { BUILDING_COLUMNS } from './building-columns.ts';
import { LISTED } from './register-columns.ts';
import type { Condition, RegisterOf } from './register-condition.ts';
import { buildingsBeside } from './columns-beside.ts';

/** Rows by their numbers, in the order of the numbers; one that was taken out meanwhile is left out. */
export async function findRows(
  database: Sequelize,
  { runId, optionId }: Pick<RegisterOf, 'runId' | 'optionId'>,
  ids: readonly number[],
): Promise<ListedBuilding[]> {
  const rows = await database.query<ListedBuilding>(
    `select ${LISTED} from ${buildingsBeside('$2', '$3')}
     where b.id = any($1) and b.removed_at is null`,
    { type: QueryTypes.SELECT, bind: [ids, runId, optionId] },
  );
  const byId = new Map(rows.map((row) => [row.id, row]));
  return ids.flatMap((id) => byId.get(id) ?? []);
}

/** How many buildings are meant. */
export async function countRows(database: Sequelize, { where, bind }: Condition): Promise<number> {
  const [row] = await database.query<{ found: number }>(
    `select count(*)::integer as found from buildings where ${where}`,
    { type: QueryTypes.SELECT, bind: [...bind] },
  );
  return row?.found ?? 0;
}

/** Which values a field has, the commonest first. */
export async function findChoices(
  database: Sequelize,
  { where, bind }: Condition,
  field: BuildingField,
): Promise<{ value: string | null; count: number }[]> {
  const { name } = BUILDING_COLUMNS[field];
  return database.query<{ value: string | null; count: number }>(
    `select ${name}::text as value, count(*)::integer as count
     from buildings where ${where}
     group by ${name} order by count desc, ${name} nulls last limit 50`,
    { type: QueryTypes.SELECT, bind: [...bind] },
  );
}

/** Some buildings, each with its version. */
export async function findVersions(
  database: Sequelize,
  ids: readonly number[],
  transaction: Transaction,
): Promise<{ id: number; version: number }[]> {
  return database.query<{ id: number; version: number }>(
    'select id, version from buildings where id = any($1::integer[]) order by id',
    { type: QueryTypes.SELECT, bind: [ids], transaction },
  );
}
