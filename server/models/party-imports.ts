import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type {
  PartyColumns,
  PartyImportCounts,
  PartyImportRow,
} from '../../shared/schemas/party-imports.ts';
import type { StagedTable } from '../parties/read-party-row.ts';

/** What an import keeps of its file: the table while it is checked, and what was said of each row. */
type Kept = { readonly table: StagedTable | null; readonly report: readonly PartyImportRow[] };

export type FoundPartyImport = {
  readonly id: string;
  readonly fileName: string;
  readonly state: 'checked' | 'taken over' | 'given up';
  readonly fileColumns: readonly string[];
  readonly columns: PartyColumns;
  readonly counts: PartyImportCounts;
  readonly by: string;
  readonly sentAt: Date;
  readonly endedAt: Date | null;
};

const MOST = 50;

/** The imports of parties of a scheme, the newest first; or one of them, with the columns of its file. */
export function findPartyImports(
  database: Sequelize,
  schemeId: string,
  id: string | null = null,
  transaction: Transaction | null = null,
): Promise<FoundPartyImport[]> {
  return database.query<FoundPartyImport>(
    `select i.id, i.file_name as "fileName", i.state, i.columns, i.counts, p.name as by,
       case when $2::uuid is null then '[]'
         else coalesce(nullif(i.rows->'table', 'null')->'columns', '[]') end as "fileColumns",
       i.sent_at as "sentAt", i.ended_at as "endedAt"
     from party_imports i join people p on p.id = i.sent_by
     where i.scheme_id = $1 and ($2::uuid is null or i.id = $2)
     order by i.sent_at desc, i.id limit ${MOST}`,
    { type: QueryTypes.SELECT, bind: [schemeId, id], transaction },
  );
}

/** The table that an import waits with; undefined where it has ended. */
export async function findStagedTable(
  database: Sequelize,
  id: string,
  transaction: Transaction,
): Promise<StagedTable | undefined> {
  const [row] = await database.query<{ table: StagedTable | null }>(
    `select nullif(rows->'table', 'null') as table from party_imports
     where id = $1 and state = 'checked' for update`,
    { type: QueryTypes.SELECT, bind: [id], transaction },
  );
  return row?.table ?? undefined;
}

/** Rows of a report, those of one outcome or with a remark, and how many there are; null for no limit. */
export async function findPartyReport(
  database: Sequelize,
  id: string,
  {
    only = null,
    offset,
    limit,
  }: { readonly only?: string | null; readonly offset: number; readonly limit: number | null },
): Promise<{ found: number; rows: PartyImportRow[] }> {
  const rows = await database.query<{ line: PartyImportRow; found: number }>(
    `select line, count(*) over ()::integer as found
     from party_imports i, jsonb_array_elements(i.rows->'report') with ordinality as told(line, place)
     where i.id = $1 and ($2::text is null or line->>'outcome' = $2
       or ($2 = 'noted' and line->'remarks' <> '[]' and line->>'outcome' <> 'problem'))
     order by place offset $3 limit $4`,
    { type: QueryTypes.SELECT, bind: [id, only, offset, limit] },
  );
  return { found: rows[0]?.found ?? 0, rows: rows.map(({ line }) => line) };
}

/** Keeps an import that was checked. */
export async function insertPartyImport(
  database: Sequelize,
  given: {
    readonly id: string;
    readonly schemeId: string;
    readonly by: string;
    readonly fileName: string;
  } & Pick<FoundPartyImport, 'columns' | 'counts'> & { readonly kept: Kept },
  transaction: Transaction,
): Promise<void> {
  const { id, schemeId, by, fileName, columns, counts, kept } = given;
  const written = [columns, kept, counts].map((value) => JSON.stringify(value));
  await database.query(
    `insert into party_imports (id, scheme_id, sent_by, file_name, state, columns, rows, counts)
     values ($1, $2, $3, $4, 'checked', $5::jsonb, $6::jsonb, $7::jsonb)`,
    { bind: [id, schemeId, by, fileName, ...written], transaction },
  );
}

/** Writes what checking an import anew came to. */
export async function updatePartyImport(
  database: Sequelize,
  id: string,
  { columns, counts, kept }: Pick<FoundPartyImport, 'columns' | 'counts'> & { readonly kept: Kept },
  transaction: Transaction,
): Promise<void> {
  const written = [columns, kept, counts].map((value) => JSON.stringify(value));
  await database.query(
    'update party_imports set columns = $2::jsonb, rows = $3::jsonb, counts = $4::jsonb where id = $1',
    { bind: [id, ...written], transaction },
  );
}

/** Gives up every import of a scheme that is not taken over yet; what their files held is forgotten. */
export async function giveUpOpenImports(
  database: Sequelize,
  schemeId: string,
  transaction: Transaction,
): Promise<number> {
  const ended = await database.query(
    `update party_imports set state = 'given up', rows = null, ended_at = now()
     where scheme_id = $1 and state = 'checked' returning id`,
    { type: QueryTypes.SELECT, bind: [schemeId], transaction },
  );
  return ended.length;
}

/** Ends an import; of what was taken over the report stays without names, else nothing stays. */
export async function endPartyImport(
  database: Sequelize,
  id: string,
  report: readonly PartyImportRow[] | null,
  transaction: Transaction,
): Promise<void> {
  const kept = report?.map((line) => ({ ...line, name: '' }));
  const rows = kept === undefined ? null : JSON.stringify({ table: null, report: kept });
  await database.query(
    `update party_imports set state = $2, rows = $3::jsonb, ended_at = now() where id = $1`,
    { bind: [id, report === null ? 'given up' : 'taken over', rows], transaction },
  );
}
