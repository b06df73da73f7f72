import { QueryTypes, type Sequelize } from 'sequelize';
import type { AlignmentDesign } from '../../shared/schemas/alignments.ts';
import type { DecisionKind } from '../../shared/schemas/decisions.ts';
import type { WhoseLetters } from './find-own-letters.ts';
import type { FoundOfBuilding } from './find-told.ts';

/** What the newest letter to an owner rested on, for one building. */
export type FoundOwnFigures = FoundOfBuilding & {
  readonly buildingId: number;
  readonly design: AlignmentDesign;
  /** What was decided of it for that line last, and has been checked by now. */
  readonly decision: DecisionKind | null;
};

/**
 * What runs found of some buildings, each by the run of the newest letter with figures that was sent to its
 * owner and names it. What could not be worked out is left out.
 */
export function findOwnFigures(
  database: Sequelize,
  schemeId: string,
  { parties, buildings }: WhoseLetters,
): Promise<FoundOwnFigures[]> {
  return database.query<FoundOwnFigures>(
    `with told as (
       select distinct on (n.building_id) n.building_id, b.run_id
       from letters l
       join letter_batches b on b.id = l.batch_id
       join letter_buildings n on n.letter_id = l.id
       where l.scheme_id = $1 and l.party_id = any($2::uuid[]) and b.state = 'sent'
         and n.building_id = any($3::integer[]) and b.run_id is not null
       order by n.building_id, b.sent_at desc, l.id
     )
     select t.building_id as "buildingId", f.wall_settlement as settlement, f.settlement as most,
       f.category_low as "categoryLow", f.category, f.category_high as "categoryHigh", r.design,
       s.facts->'parts' as parts, (s.facts->>'groundLevel')::double precision as "groundLevel",
       (select d.kind from decisions d
        where d.building_id = t.building_id and d.alignment_id = r.alignment_id
          and d.state = 'checked'
        order by d.checked_at desc limit 1) as decision
     from told t
     join runs r on r.id = t.run_id
     join run_results f on f.run_id = t.run_id and f.building_id = t.building_id
     join run_buildings v on v.run_id = t.run_id and v.building_id = t.building_id
     join building_snapshots s on s.building_id = v.building_id and s.version = v.version
     where f.fault is null`,
    {
      type: QueryTypes.SELECT,
      bind: [schemeId, parties, buildings.map(({ id }) => id)],
    },
  );
}
