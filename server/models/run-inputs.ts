import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { BoxInDegrees } from '../runs/boxes-on-grid.ts';

/** What the method and the record ask of a building, as text that is read when it is worked with. */
const FACTS = `jsonb_build_object(
  'id', b.id::text, 'reference', b.reference, 'name', b.name, 'address', b.address, 'use', b.use,
  'parts', f.footprint, 'storeys', b.storeys, 'eavesHeight', b.eaves_height,
  'groundLevel', b.ground_level, 'foundingLevel', b.founding_level, 'foundation', b.foundation,
  'construction', b.construction, 'eOverG', b.e_over_g, 'poisson', b.poisson,
  'listedGrade', b.listed_grade, 'condition', b.condition, 'inspected', b.inspected,
  'structureScore', b.structure_score, 'structureReason', b.structure_reason,
  'featuresScore', b.features_score, 'featuresReason', b.features_reason
)`;

/**
 * Keeps every building of a register as it is, where it is not kept yet at its version, and says which
 * versions a run goes by.
 */
export async function snapshotRegister(
  database: Sequelize,
  { runId, schemeId }: { readonly runId: string; readonly schemeId: string },
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into building_snapshots (building_id, version, facts, west, south, east, north)
     select b.id, b.version, ${FACTS}, b.west, b.south, b.east, b.north
     from buildings b join building_footprints f on f.building_id = b.id
     where b.scheme_id = $1 and b.removed_at is null and not exists (
       select from building_snapshots s where s.building_id = b.id and s.version = b.version
     )`,
    { bind: [schemeId], transaction },
  );
  await database.query(
    `insert into run_buildings (run_id, building_id, version)
     select $1, id, version from buildings where scheme_id = $2 and removed_at is null`,
    { bind: [runId, schemeId], transaction },
  );
}

/** The boxes of a run's buildings in degrees, in the order of their numbers. */
export function findRunBoxes(database: Sequelize, runId: string): Promise<BoxInDegrees[]> {
  return database.query<BoxInDegrees>(
    `select r.building_id as id, s.west, s.south, s.east, s.north
     from run_buildings r join building_snapshots s using (building_id, version)
     where r.run_id = $1 order by r.building_id`,
    { type: QueryTypes.SELECT, bind: [runId] },
  );
}

/** What was known of some buildings when a run was started, as the text of a list. */
export async function findFactsText(
  database: Sequelize,
  runId: string,
  ids: readonly number[],
): Promise<string> {
  const [row] = await database.query<{ facts: string }>(
    `select coalesce(json_agg(s.facts order by s.building_id)::text, '[]') as facts
     from run_buildings r join building_snapshots s using (building_id, version)
     where r.run_id = $1 and r.building_id = any($2)`,
    { type: QueryTypes.SELECT, bind: [runId, ids] },
  );
  return row?.facts ?? '[]';
}
