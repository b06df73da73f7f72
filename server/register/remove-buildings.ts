import { insertBuildingChanges } from '../models/building-changes.ts';
import { markRemoved, updateBuildingStates } from '../models/building-state.ts';
import { seenBuildings, snapshot, type Editing } from './editing.ts';
import type { VersionedBuilding } from './register-edits.ts';

/** Takes some buildings out, at the versions that were seen. */
export async function removeBuildings(
  editing: Editing,
  edits: readonly VersionedBuilding[],
): Promise<void> {
  const { database, changeId, transaction } = editing;
  const kept = await seenBuildings(editing, edits, false);
  await markRemoved(
    database,
    kept.map(({ id }) => id),
    transaction,
  );
  const changes = kept.map((building) => {
    const [before, version] = [snapshot(building), building.version + 1];
    return { buildingId: building.id, version, before, after: null };
  });
  await insertBuildingChanges(database, changeId, changes, transaction);
}

/** Puts some buildings back that were taken out, as they were. */
export async function restoreBuildings(
  editing: Editing,
  edits: readonly VersionedBuilding[],
): Promise<number[]> {
  const { database, changeId, transaction } = editing;
  const kept = await seenBuildings(editing, edits, true);
  const rows = kept.map((building) => ({ ...building, version: building.version + 1 }));
  await updateBuildingStates(database, rows, transaction);
  const changes = rows.map((building) => {
    const after = snapshot(building);
    return { buildingId: building.id, version: building.version, before: null, after };
  });
  await insertBuildingChanges(database, changeId, changes, transaction);
  return rows.map(({ id }) => id);
}
