import { QueryTypes, type Sequelize } from 'sequelize';
import type { VisitedBuilding, VisitAnswer } from '../../shared/schemas/visits.ts';

type Photograph = VisitAnswer['photographs'][number];

/** A visit with who made it and its photographs, as its presenter wants it. */
export type FoundVisit = Omit<VisitAnswer, 'visitedAt' | 'recordedAt' | 'photographs'> & {
  readonly visitedAt: Date;
  readonly recordedAt: Date;
  readonly photographs: readonly Photograph[];
};

const MOST_VISITS = 200;
const MOST_BUILDINGS = 2000;

const PHOTOGRAPHS = `
  select coalesce(json_agg(json_build_object(
      'id', p.id, 'caption', p.caption, 'takenAt', p.taken_at, 'width', p.width, 'height', p.height,
      'keepsPlace', p.keeps_place,
      'place', case when p.longitude is null then null
        else json_build_array(p.longitude, p.latitude) end,
      'hasArrived', f.photograph_id is not null
    ) order by p.number), '[]')
  from visit_photographs p left join visit_photograph_files f on f.photograph_id = p.id
  where p.visit_id = v.id`;

/** The visits of a building, the newest first; only one of them where its number is given. */
export function findVisits(
  database: Sequelize,
  buildingId: number,
  visitId: string | null = null,
): Promise<FoundVisit[]> {
  return database.query<FoundVisit>(
    `select v.id, v.building_id as "buildingId", v.visited_at as "visitedAt",
       v.recorded_at as "recordedAt", person.name as by, v.part, v.condition, v.construction, v.notes,
       v.defects, (${PHOTOGRAPHS}) as photographs
     from visits v join people person on person.id = v.visited_by
     where v.building_id = $1 and ($2::uuid is null or v.id = $2)
     order by v.visited_at desc, v.recorded_at desc limit ${MOST_VISITS}`,
    { type: QueryTypes.SELECT, bind: [buildingId, visitId] },
  );
}

/** A building that has been visited, as its presenter wants it. */
export type FoundVisitedBuilding = Omit<VisitedBuilding, 'visitedAt'> & {
  readonly visitedAt: Date;
};

/** The buildings of a scheme that have been visited, each with its last visit, the newest first. */
export function findVisitedBuildings(
  database: Sequelize,
  schemeId: string,
): Promise<FoundVisitedBuilding[]> {
  return database.query<FoundVisitedBuilding>(
    `select last.building_id as "buildingId", b.reference, b.name, b.address, last.visits,
       last.visited_at as "visitedAt", person.name as by, last.part
     from (
       select distinct on (building_id) building_id, visited_at, visited_by, part,
         (count(*) over (partition by building_id))::integer as visits
       from visits where scheme_id = $1
       order by building_id, visited_at desc, recorded_at desc
     ) last
     join buildings b on b.id = last.building_id
     join people person on person.id = last.visited_by
     where b.removed_at is null
     order by last.visited_at desc, b.reference limit ${MOST_BUILDINGS}`,
    { type: QueryTypes.SELECT, bind: [schemeId] },
  );
}
