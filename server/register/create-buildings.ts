import { footprintArea } from '../../shared/building/footprint-area.ts';
import { placedFootprint } from '../importers/placed-footprint.ts';
import { insertBuildingChanges } from '../models/building-changes.ts';
import { eachField } from '../models/building-columns.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { insertBuildingStates, type BuildingState } from '../models/building-state.ts';
import { writeFootprints } from '../models/footprints.ts';
import { levelWriter, snapshot, type Editing } from './editing.ts';
import type { CreatedBuilding } from './register-edits.ts';

/** A building that is new, with all that follows from its footprint. */
export type Placed = {
  readonly state: BuildingState;
  readonly footprint: FootprintRings;
  readonly lonLat: FootprintRings;
};

async function placed(editing: Editing, building: CreatedBuilding): Promise<Placed> {
  const { reference, attributes, imported = {} } = building;
  const place = placedFootprint(reference, building.footprint, editing.place);
  const { footprint, lonLat, bounds } = place;
  const given = attributes.groundLevel ?? null;
  const sampled = given === null ? await editing.groundUnder(footprint) : null;
  const level = given ?? sampled;
  const written = sampled === null ? levelWriter(editing.kind) : 'ground';
  const state = {
    reference,
    ...eachField((field) => attributes[field] ?? null),
    groundLevel: level,
    groundLevelFrom: level === null ? null : (building.groundLevelFrom ?? written),
    imported,
    area: footprintArea(footprint),
    ...bounds,
  };
  return { state, footprint, lonLat };
}

/** Lists of new buildings with all that follows from their footprints. */
export async function* placedBuildings(
  editing: Editing,
  lists: AsyncIterable<readonly CreatedBuilding[]>,
): AsyncGenerator<readonly Placed[]> {
  for await (const buildings of lists) {
    const rows: Placed[] = [];
    for (const building of buildings) rows.push(await placed(editing, building));
    yield rows;
  }
}

/** Brings some buildings in, with their footprints and the beginning of their histories; gives their numbers. */
export async function createBuildings(
  editing: Editing,
  rows: readonly Placed[],
): Promise<number[]> {
  const { database, schemeId, changeId, transaction } = editing;
  const states = rows.map(({ state }) => state);
  const ids = await insertBuildingStates(database, schemeId, states, transaction);
  const numbered = rows.map((row, index) => ({ ...row, id: ids[index] ?? 0 }));
  await writeFootprints(database, numbered, transaction);
  const changes = numbered.map(({ id, state }) => {
    return { buildingId: id, version: 1, before: null, after: snapshot(state) };
  });
  await insertBuildingChanges(database, changeId, changes, transaction);
  return ids;
}
