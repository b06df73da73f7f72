import { QueryTypes, type Sequelize } from 'sequelize';
import type { Position } from 'geojson';
import type { ImportAnswer, ImportRow } from '../../shared/schemas/imports.ts';
import type { LonLatBox } from './find-buildings-in-box.ts';

type Counts = NonNullable<ImportAnswer['counts']>;
type Sums = Omit<Counts, 'absent'> & { readonly bounds: ImportAnswer['bounds'] };

/** The rows of an import counted by what becomes of them, with the area and bounds of those taken. */
export async function sumImport(database: Sequelize, importId: string): Promise<Sums> {
  const [sums] = await database.query<Sums>(
    `select count(*)::integer as rows,
       (count(*) filter (where outcome = 'new'))::integer as new,
       (count(*) filter (where outcome = 'changed'))::integer as changed,
       (count(*) filter (where outcome = 'same'))::integer as same,
       (count(*) filter (where outcome = 'conflict'))::integer as conflict,
       (count(*) filter (where outcome = 'refused'))::integer as refused,
       (count(*) filter (where remarks <> '[]'))::integer as noted,
       (count(*) filter (where is_mended))::integer as mendable,
       coalesce(sum(area) filter (where outcome <> 'refused'), 0) as area,
       case when count(west) filter (where outcome <> 'refused') > 0 then array[
         min(west) filter (where outcome <> 'refused'), min(south) filter (where outcome <> 'refused'),
         max(east) filter (where outcome <> 'refused'), max(north) filter (where outcome <> 'refused')
       ] end as bounds
     from import_rows where import_id = $1`,
    { type: QueryTypes.SELECT, bind: [importId] },
  );
  if (sums === undefined) throw new Error('A count without a row.');
  return sums;
}

/** How many buildings of a scheme no row of an import speaks of. */
export async function countAbsent(
  database: Sequelize,
  schemeId: string,
  importId: string,
): Promise<number> {
  const [row] = await database.query<{ absent: number }>(
    `select count(*)::integer as absent from buildings
     where scheme_id = $1 and removed_at is null and id not in
       (select building_id from import_rows where import_id = $2 and building_id is not null)`,
    { type: QueryTypes.SELECT, bind: [schemeId, importId] },
  );
  return row?.absent ?? 0;
}

const REPORTED = `row, reference, outcome, remarks, changes, area, is_mended as "isMended",
  case when west is not null then array[(west + east) / 2, (south + north) / 2] end as centre`;
const ASKED = `import_id = $1 and outcome is not null
  and ($2::text is null or outcome = $2 or ($2 = 'noted' and remarks <> '[]'))`;

/** Which rows of a report are wanted. */
export type ReportQuery = {
  readonly outcome: string | null;
  readonly offset: number;
  readonly limit: number;
};

/** A page of an import's report in the file's order, with how many rows there are by the filter. */
export async function findReportPage(
  database: Sequelize,
  importId: string,
  { outcome, offset, limit }: ReportQuery,
): Promise<{ rows: ImportRow[]; found: number }> {
  const bind = [importId, outcome];
  const [rows, [count]] = await Promise.all([
    database.query<ImportRow>(
      `select ${REPORTED} from import_rows where ${ASKED} order by row offset $3 limit $4`,
      { type: QueryTypes.SELECT, bind: [...bind, offset, limit] },
    ),
    database.query<{ found: number }>(
      `select count(*)::integer as found from import_rows where ${ASKED}`,
      { type: QueryTypes.SELECT, bind },
    ),
  ]);
  return { rows, found: count?.found ?? 0 };
}

/** The next rows of a report after one, for writing it out. */
export async function findReportAfter(
  database: Sequelize,
  importId: string,
  after: number,
  limit: number,
): Promise<ImportRow[]> {
  return database.query<ImportRow>(
    `select ${REPORTED} from import_rows
     where import_id = $1 and row > $2 and (remarks <> '[]' or changes <> '[]')
     order by row limit $3`,
    { type: QueryTypes.SELECT, bind: [importId, after, limit] },
  );
}

export type DrawnRow = {
  readonly row: number;
  readonly reference: string | null;
  readonly outcome: string;
  readonly lonLat: Position[][][];
};

/** The footprints of an import that may reach into a box. */
export async function findRowsInBox(
  database: Sequelize,
  importId: string,
  [west, south, east, north]: LonLatBox,
): Promise<DrawnRow[]> {
  return database.query<DrawnRow>(
    `select row, reference, outcome, lon_lat as "lonLat" from import_rows
     where import_id = $1 and west is not null
       and box(point(west, south), point(east, north)) && box(point($2, $3), point($4, $5))
     order by row`,
    { type: QueryTypes.SELECT, bind: [importId, west, south, east, north] },
  );
}

/** How many rows with conflicts nobody has settled. */
export async function countUnsettled(
  database: Sequelize,
  importId: string,
  settled: readonly string[],
): Promise<number> {
  const [row] = await database.query<{ unsettled: number }>(
    `select count(*)::integer as unsettled from import_rows
     where import_id = $1 and outcome = 'conflict' and reference <> all($2::text[])`,
    { type: QueryTypes.SELECT, bind: [importId, settled] },
  );
  return row?.unsettled ?? 0;
}
