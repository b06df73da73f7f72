import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { EvidenceLayout } from '../../shared/schemas/evidence.ts';

/** A named layout with who changed it last, as its presenter wants it. */
export type FoundLayout = {
  readonly id: string;
  readonly name: string;
  readonly version: number;
  readonly layout: EvidenceLayout;
  readonly changedAt: Date;
  readonly changedBy: string | null;
};

type Kept = { readonly name: string; readonly layout: EvidenceLayout; readonly by: string };

/** The layouts of a scheme by name, or one of them. */
export function findLayouts(
  database: Sequelize,
  schemeId: string,
  layoutId: string | null = null,
  transaction: Transaction | null = null,
): Promise<FoundLayout[]> {
  return database.query<FoundLayout>(
    `select l.id, l.name, l.version, l.layout, l.changed_at as "changedAt", p.name as "changedBy"
     from plan_layouts l left join people p on p.id = l.changed_by
     where l.scheme_id = $1 and ($2::uuid is null or l.id = $2)
     order by l.name collate natural_order, l.id`,
    { type: QueryTypes.SELECT, bind: [schemeId, layoutId], transaction },
  );
}

/** Keeps a new layout. */
export async function insertLayout(
  database: Sequelize,
  { id, schemeId }: { readonly id: string; readonly schemeId: string },
  { name, layout, by }: Kept,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into plan_layouts (id, scheme_id, name, layout, changed_by)
     values ($1, $2, $3, $4::jsonb, $5)`,
    { bind: [id, schemeId, name, JSON.stringify(layout), by], transaction },
  );
}

/** Writes a layout anew. */
export async function updateLayout(
  database: Sequelize,
  id: string,
  { name, layout, by }: Kept,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update plan_layouts set name = $2, layout = $3::jsonb, changed_by = $4, changed_at = now(),
       version = version + 1 where id = $1`,
    { bind: [id, name, JSON.stringify(layout), by], transaction },
  );
}

/** Forgets a layout. */
export async function deleteLayout(
  database: Sequelize,
  id: string,
  transaction: Transaction,
): Promise<void> {
  await database.query('delete from plan_layouts where id = $1', { bind: [id], transaction });
}
