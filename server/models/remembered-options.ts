import { QueryTypes, type Sequelize } from 'sequelize';
import type { ImportOptions } from '../../shared/schemas/imports.ts';

/** What was chosen for an earlier file, with its name and when it was sent. */
export type RememberedOptions = {
  readonly options: ImportOptions;
  readonly fileName: string;
  readonly at: Date;
};

/** What was chosen for the last file of a scheme with the same columns; undefined for a new kind of file. */
export async function findRememberedOptions(
  database: Sequelize,
  schemeId: string,
  kind: 'footprints' | 'values',
  names: readonly string[],
): Promise<RememberedOptions | undefined> {
  const [found] = await database.query<RememberedOptions>(
    `select options, file_name as "fileName", at from imports
     where scheme_id = $1 and kind = $2 and state in ('asking', 'done', 'cancelled')
       and columns <> '[]' and (
         select coalesce(jsonb_agg(name order by name), '[]')
         from jsonb_path_query(columns, '$[*].name') as one(name)
       ) = (select coalesce(jsonb_agg(to_jsonb(name) order by to_jsonb(name)), '[]') from unnest($3::text[]) as one(name))
     order by at desc limit 1`,
    { type: QueryTypes.SELECT, bind: [schemeId, kind, names] },
  );
  return found;
}
