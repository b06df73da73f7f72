import { QueryTypes, type Sequelize } from 'sequelize';
import type { UploadRow } from '../importers/upload.ts';
import type { RowRange } from './row-ranges.ts';

type Point = [number, number];

/** Keeps rows of a file as they were read, by the column, which is many times faster than by the row. */
export async function insertStagedRows(
  database: Sequelize,
  importId: string,
  rows: readonly UploadRow[],
): Promise<void> {
  await database.query(
    `insert into import_rows (import_id, row, geometry, fault, properties)
     select $1, given.* from unnest($2::integer[], $3::jsonb[], $4::text[], $5::jsonb[]) as given`,
    {
      bind: [
        importId,
        rows.map(({ row }) => row),
        rows.map(({ geometry }) => (geometry === null ? null : JSON.stringify(geometry))),
        rows.map(({ fault }) => fault),
        rows.map(({ properties }) => JSON.stringify(properties)),
      ],
    },
  );
}

/** The rows of an import from one number to another, in the file's order. */
export async function findStagedRows(
  database: Sequelize,
  importId: string,
  { first, last }: RowRange,
): Promise<UploadRow[]> {
  return database.query<UploadRow>(
    `select row, geometry, fault, properties from import_rows
     where import_id = $1 and row between $2 and $3 order by row`,
    { type: QueryTypes.SELECT, bind: [importId, first, last] },
  );
}

/** One row as it was read; undefined where there is none. */
export async function findStagedRow(
  database: Sequelize,
  importId: string,
  row: number,
): Promise<UploadRow | undefined> {
  const [found] = await findStagedRows(database, importId, { first: row, last: row });
  return found;
}

/** The first corner of every footprint of an import. */
export async function findFirstCorners(database: Sequelize, importId: string): Promise<Point[]> {
  const rows = await database.query<{ x: number; y: number }>(
    `select (corner->>0)::float8 as x, (corner->>1)::float8 as y
     from (select geometry#>'{0,0,0}' as corner from import_rows
           where import_id = $1 and geometry is not null and fault is null) as given`,
    { type: QueryTypes.SELECT, bind: [importId] },
  );
  return rows.map(({ x, y }): Point => [x, y]);
}

/** Forgets the rows of an import; those with a remark may stay for its report. */
export async function deleteStagedRows(
  database: Sequelize,
  importId: string,
  { keepNoted }: { readonly keepNoted: boolean },
): Promise<void> {
  await database.query(
    `delete from import_rows
     where import_id = $1 and (not $2 or (remarks = '[]' and outcome <> 'refused'))`,
    { bind: [importId, keepNoted] },
  );
}
