import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { DecisionKind } from '../../shared/schemas/decisions.ts';
import type { RunFacts } from '../../shared/schemas/runs.ts';

/** What a run found of a building, as far as its owner is told of it, and the building as the run had it. */
export type FoundOfBuilding = {
  readonly settlement: number | null;
  readonly most: number;
  readonly categoryLow: number | null;
  readonly category: number | null;
  readonly categoryHigh: number | null;
  readonly parts: RunFacts['parts'];
  readonly groundLevel: number | null;
};

/** What a letter can tell of a building. */
export type Told = {
  readonly id: number;
  readonly reference: string;
  readonly name: string | null;
  readonly address: string | null;
  readonly use: string | null;
  readonly listedGrade: string | null;
  /** What the run found; null where it was not in the run, or could not be worked out. */
  readonly found: FoundOfBuilding | null;
  /** What has been decided for the line of the run, and checked. */
  readonly decision: DecisionKind | null;
  /** Protective measures that are agreed or further on. */
  readonly measures: readonly string[];
};

/** What letters can tell of some buildings by a run and by what has been decided since. */
export function findTold(
  database: Sequelize,
  { runId, optionId }: { readonly runId: string | null; readonly optionId: string | null },
  ids: readonly number[],
  transaction: Transaction | null,
): Promise<Told[]> {
  return database.query<Told>(
    `select b.id, b.reference, b.name, b.address, b.use, b.listed_grade as "listedGrade",
       case when f.building_id is not null and f.fault is null then json_build_object(
         'settlement', f.wall_settlement, 'most', f.settlement, 'categoryLow', f.category_low,
         'category', f.category, 'categoryHigh', f.category_high, 'parts', s.facts->'parts',
         'groundLevel', (s.facts->>'groundLevel')::double precision) end as found,
       (select d.kind from decisions d where d.building_id = b.id and d.alignment_id = $2::uuid
         and d.state = 'checked' limit 1) as decision,
       array(select m.title from measures m join measure_buildings o on o.measure_id = m.id
         where o.building_id = b.id and m.state in ('agreed', 'in place', 'done')
         order by m.due nulls last, m.title) as measures
     from buildings b
     left join run_results f on f.run_id = $1::uuid and f.building_id = b.id
     left join run_buildings v on v.run_id = $1::uuid and v.building_id = b.id
     left join building_snapshots s on s.building_id = v.building_id and s.version = v.version
     where b.id = any($3::integer[]) order by b.reference collate natural_order`,
    { type: QueryTypes.SELECT, bind: [runId, optionId, ids], transaction },
  );
}
