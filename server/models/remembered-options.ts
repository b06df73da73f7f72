import { QueryTypes, type Sequelize } from 'sequelize';
import type { ImportOptions } from '../../shared/schemas/imports.ts';

/** What was chosen for the last file of a scheme with the same columns; undefined for a new kind of file. */
export async function findRememberedOptions(
  database: Sequelize,
  schemeId: string,
  kind: 'footprints' | 'values',
  names: readonly string[],
): Promise<ImportOptions | undefined> {
  const [found] = await database.query<{ options: ImportOptions }>(
    `select options from imports
     where scheme_id = $1 and kind = $2 and state in ('asking', 'done', 'cancelled')
       and columns <> '[]' and (
         select coalesce(jsonb_agg(name order by name), '[]')
         from jsonb_path_query(columns, '$[*].name') as one(name)
       ) = (select coalesce(jsonb_agg(to_jsonb(name) order by to_jsonb(name)), '[]') from unnest($3::text[]) as one(name))
     order by at desc limit 1`,
    { type: QueryTypes.SELECT, bind: [schemeId, kind, names] },
  );
  return found?.options;
}
