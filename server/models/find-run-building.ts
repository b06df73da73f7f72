import { QueryTypes, type Sequelize } from 'sequelize';
import type { RunFacts } from '../../shared/schemas/runs.ts';
import { AppError } from '../errors.ts';
import { findFactsText } from './run-inputs.ts';

export type FoundRunBuilding = {
  readonly version: number;
  readonly facts: RunFacts;
  /** Whether the register holds another version by now, or none. */
  readonly changedSince: boolean;
};

/** A building as a run took it; one that was not in the run is not there. */
export async function findRunBuilding(
  database: Sequelize,
  runId: string,
  buildingId: number,
): Promise<FoundRunBuilding> {
  const [row] = await database.query<FoundRunBuilding>(
    `select r.version, s.facts, (b.removed_at is not null or b.version <> r.version) as "changedSince"
     from run_buildings r
     join building_snapshots s using (building_id, version)
     join buildings b on b.id = r.building_id
     where r.run_id = $1 and r.building_id = $2`,
    { type: QueryTypes.SELECT, bind: [runId, buildingId] },
  );
  if (row === undefined) throw new AppError('not-found');
  return row;
}

/** All who may share a wall with a building of a run, itself among them, as the text of a list. */
export async function findNeighboursText(
  database: Sequelize,
  runId: string,
  buildingId: number,
): Promise<string> {
  const [chunk] = await database.query<{ ids: number[] }>(
    'select members || beside as ids from run_chunks where run_id = $1 and $2 = any(members)',
    { type: QueryTypes.SELECT, bind: [runId, buildingId] },
  );
  return findFactsText(database, runId, chunk?.ids ?? [buildingId]);
}
