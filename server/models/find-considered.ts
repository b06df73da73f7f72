import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { RegisterFacts } from '../../shared/assessment/prepared-building.ts';
import type { RunResult } from '../../shared/schemas/runs.ts';

/** A building as the register has it with what a run found of it; `result` is null where it was not in it. */
export type Considered = {
  readonly id: number;
  readonly version: number;
  readonly facts: RegisterFacts;
  readonly result: ConsideredResult | null;
};

export type ConsideredResult = Pick<
  RunResult,
  | 'settlement'
  | 'slope'
  | 'strain'
  | 'categoryLow'
  | 'category'
  | 'categoryHigh'
  | 'isSettled'
  | 'breakpoint'
  | 'reserve'
  | 'assumed'
  | 'fault'
>;

// the footprint is large, and asked for only where a founding level has no ground level beside it
const FACTS = `json_build_object(
  'id', b.id::text, 'storeys', b.storeys, 'eavesHeight', b.eaves_height,
  'groundLevel', b.ground_level, 'foundingLevel', b.founding_level, 'foundation', b.foundation,
  'construction', b.construction, 'eOverG', b.e_over_g, 'poisson', b.poisson,
  'listedGrade', b.listed_grade, 'condition', b.condition,
  'structureScore', b.structure_score, 'featuresScore', b.features_score,
  'parts', case when b.ground_level is null and b.founding_level is not null
    then f.footprint else '[]'::jsonb end
)`;

const RESULT = `case when r.building_id is not null then json_build_object(
  'settlement', r.settlement, 'slope', r.slope, 'strain', r.strain,
  'categoryLow', r.category_low, 'category', r.category, 'categoryHigh', r.category_high,
  'isSettled', r.is_settled, 'breakpoint', r.breakpoint, 'reserve', r.reserve,
  'assumed', r.assumed, 'fault', r.fault
) end`;

/** Some buildings of the register as they are, each with what a run found of it. */
export function findConsidered(
  database: Sequelize,
  runId: string,
  ids: readonly number[],
  transaction: Transaction | null,
): Promise<Considered[]> {
  return database.query<Considered>(
    `select b.id, b.version, ${FACTS} as facts, ${RESULT} as result
     from buildings b
     join building_footprints f on f.building_id = b.id
     left join run_results r on r.run_id = $1 and r.building_id = b.id
     where b.id = any($2) and b.removed_at is null
     order by b.id`,
    { type: QueryTypes.SELECT, bind: [runId, ids], transaction },
  );
}
