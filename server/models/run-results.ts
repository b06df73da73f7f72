import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { runCountsSchema, type RunCounts, type RunResult } from '../../shared/schemas/runs.ts';

/** How each figure of a result is called in the record and in the table, and of what type it is. */
export const RECORDED_COLUMNS = {
  stage: ['stage', 'smallint'],
  settlement: ['settlement', 'double precision'],
  slope: ['slope', 'double precision'],
  strainLow: ['strain_low', 'double precision'],
  strain: ['strain', 'double precision'],
  strainHigh: ['strain_high', 'double precision'],
  categoryLow: ['category_low', 'smallint'],
  category: ['category', 'smallint'],
  categoryHigh: ['category_high', 'smallint'],
  rankin: ['rankin', 'text'],
  wallSettlement: ['wall_settlement', 'double precision'],
  wallSlope: ['wall_slope', 'double precision'],
  breakpoint: ['breakpoint', 'double precision'],
  breakpointVolumeLoss: ['breakpoint_volume_loss', 'double precision'],
  reserve: ['reserve', 'double precision'],
  reserveOverHigh: ['reserve_over_high', 'double precision'],
  isSettled: ['is_settled', 'boolean'],
  sensitiveTo: ['sensitive_to', 'text'],
  governingWall: ['governing_wall', 'text'],
  isRow: ['is_row', 'boolean'],
  mode: ['mode', 'text'],
  deflectionRatio: ['deflection_ratio', 'double precision'],
  horizontalStrain: ['horizontal_strain', 'double precision'],
  heldBy: ['held_by', 'text[]'],
  assumed: ['assumed', 'text[]'],
  warnings: ['warnings', 'text[]'],
  fault: ['fault', 'text'],
  chainage: ['chainage', 'double precision'],
  offset: ['line_offset', 'double precision'],
} as const;

const ENTRIES = Object.entries(RECORDED_COLUMNS);
const TABLE = ENTRIES.map(([, [column]]) => column).join(', ');
const GIVEN = ENTRIES.map(([name]) => `"${name}"`).join(', ');
const TYPED = ENTRIES.map(([name, [, type]]) => `"${name}" ${type}`).join(', ');

/** Writes the results of a part of a run, which come as the text of a list. */
export async function insertResults(
  database: Sequelize,
  runId: string,
  results: string,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into run_results (run_id, building_id, ${TABLE})
     select $1, "buildingId", ${GIVEN}
     from jsonb_to_recordset($2::jsonb) as given ("buildingId" integer, ${TYPED})`,
    { bind: [runId, results], transaction },
  );
}

const CATEGORIES = [0, 1, 2, 3, 4];

function categoriesSql(column: string): string {
  return CATEGORIES.map((k) => `count(*) filter (where ${column} = ${k})::integer`).join(', ');
}

/** How many buildings of a run stand where. */
export async function countResults(database: Sequelize, runId: string): Promise<RunCounts> {
  const [row] = await database.query<RunCounts>(
    `select
       array[count(*) filter (where stage = 1)::integer, count(*) filter (where stage = 2)::integer,
         count(*) filter (where stage = 3)::integer] as stages,
       array[${categoriesSql('category_low')}] as low,
       array[${categoriesSql('category')}] as central,
       array[${categoriesSql('category_high')}] as high,
       count(*) filter (where not is_settled)::integer as sensitive,
       count(*) filter (where cardinality(held_by) > 0)::integer as held,
       count(*) filter (where cardinality(assumed) > 0)::integer as assumed,
       count(*) filter (where fault is not null)::integer as faults
     from run_results where run_id = $1`,
    { type: QueryTypes.SELECT, bind: [runId] },
  );
  return runCountsSchema.parse(row);
}

/** The figures of all buildings of a run that the map is coloured by, as text. */
export async function findMapText(database: Sequelize, runId: string): Promise<string> {
  const list = (value: string) => `coalesce(json_agg(${value} order by building_id), '[]')`;
  const [row] = await database.query<{ figures: string }>(
    `select json_build_object(
       'ids', ${list('building_id')}, 'stage', ${list('stage')},
       'low', ${list('coalesce(category_low, -1)')},
       'central', ${list('coalesce(category, -1)')},
       'high', ${list('coalesce(category_high, -1)')},
       'settlement', ${list('round(settlement::numeric, 6)')}
     )::text as figures
     from run_results where run_id = $1`,
    { type: QueryTypes.SELECT, bind: [runId] },
  );
  return row?.figures ?? '{}';
}

/** The columns of a result, by the names of the record. */
export const RESULT_RECORD = ENTRIES.map(([name, [column]]) => `${column} as "${name}"`).join(', ');

/** What a run recorded of one building; undefined where it was not in it, or is not worked out yet. */
export async function findResult(
  database: Sequelize,
  runId: string,
  buildingId: number,
): Promise<RunResult | undefined> {
  const [row] = await database.query<RunResult>(
    `select ${RESULT_RECORD} from run_results where run_id = $1 and building_id = $2`,
    { type: QueryTypes.SELECT, bind: [runId, buildingId] },
  );
  return row;
}
