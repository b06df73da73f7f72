import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { MeasureValues } from '../../shared/schemas/measures.ts';

/** A measure with its buildings, as its presenter wants it. */
export type FoundMeasure = Omit<MeasureValues, 'buildings'> & {
  readonly id: string;
  readonly version: number;
  readonly createdBy: string;
  readonly changedAt: Date;
  readonly buildings: readonly { id: number; reference: string; name: string | null }[];
};

const MOST = 1000;

/** The measures of a scheme, or those of one building, what is due first before the others. */
export function findMeasures(
  database: Sequelize,
  schemeId: string,
  which: { readonly building?: number | undefined; readonly id?: string } = {},
  transaction: Transaction | null = null,
): Promise<FoundMeasure[]> {
  return database.query<FoundMeasure>(
    `select m.id, m.kind, m.title, m.detail, m.state, m.responsible, m.due::text as due,
       m.loss_limit as limit, m.version, p.name as "createdBy", m.changed_at as "changedAt",
       coalesce((
         select json_agg(json_build_object('id', b.id, 'reference', b.reference, 'name', b.name)
           order by b.reference collate natural_order)
         from measure_buildings mb join buildings b on b.id = mb.building_id
         where mb.measure_id = m.id
       ), '[]') as buildings
     from measures m join people p on p.id = m.created_by
     where m.scheme_id = $1
       and ($2::integer is null or exists (
         select from measure_buildings o where o.measure_id = m.id and o.building_id = $2))
       and ($3::uuid is null or m.id = $3)
     order by m.due nulls last, m.title collate natural_order, m.id limit ${MOST}`,
    {
      type: QueryTypes.SELECT,
      bind: [schemeId, which.building ?? null, which.id ?? null],
      transaction,
    },
  );
}

const VALUES = `kind = $3, title = $4, detail = $5, state = $6, responsible = $7, due = $8::date,
  loss_limit = $9::jsonb`;

function bound(values: MeasureValues): unknown[] {
  const { kind, title, detail, state, responsible, due, limit } = values;
  return [kind, title, detail, state, responsible, due, limit && JSON.stringify(limit)];
}

async function writeBuildings(
  database: Sequelize,
  id: string,
  { buildings }: MeasureValues,
  transaction: Transaction,
): Promise<void> {
  await database.query('delete from measure_buildings where measure_id = $1', {
    bind: [id],
    transaction,
  });
  await database.query(
    `insert into measure_buildings (measure_id, building_id)
     select distinct $1::uuid, id from unnest($2::integer[]) as id`,
    { bind: [id, buildings], transaction },
  );
}

/** Keeps a new measure. */
export async function insertMeasure(
  database: Sequelize,
  { id, schemeId, by }: { readonly id: string; readonly schemeId: string; readonly by: string },
  values: MeasureValues,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into measures (id, scheme_id, kind, title, detail, state, responsible, due, loss_limit,
       created_by)
     values ($1, $2, $3, $4, $5, $6, $7, $8::date, $9::jsonb, $10)`,
    { bind: [id, schemeId, ...bound(values), by], transaction },
  );
  await writeBuildings(database, id, values, transaction);
}

/** Writes a measure anew. */
export async function updateMeasure(
  database: Sequelize,
  { id, schemeId }: { readonly id: string; readonly schemeId: string },
  values: MeasureValues,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update measures set ${VALUES}, version = version + 1, changed_at = now()
     where id = $1 and scheme_id = $2`,
    { bind: [id, schemeId, ...bound(values)], transaction },
  );
  await writeBuildings(database, id, values, transaction);
}

/** How many of some buildings are in the register of a scheme. */
export async function countInRegister(
  database: Sequelize,
  schemeId: string,
  ids: readonly number[],
  transaction: Transaction,
): Promise<number> {
  const [row] = await database.query<{ count: number }>(
    `select count(*)::integer as count from buildings
     where scheme_id = $1 and removed_at is null and id = any($2)`,
    { type: QueryTypes.SELECT, bind: [schemeId, ids], transaction },
  );
  return row?.count ?? 0;
}
