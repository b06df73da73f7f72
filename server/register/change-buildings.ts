import { isDeepStrictEqual } from 'node:util';
import { footprintArea } from '../../shared/building/footprint-area.ts';
import { BUILDING_FIELD_NAMES } from '../../shared/schemas/building-fields.ts';
import { placedFootprint } from '../importers/placed-footprint.ts';
import { insertBuildingChanges } from '../models/building-changes.ts';
import { eachField } from '../models/building-columns.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import {
  updateBuildingStates,
  type BuildingState,
  type KeptBuilding,
} from '../models/building-state.ts';
import type { GroundLevelFrom } from '../models/building.ts';
import { findFootprints, writeFootprints, type KeptFootprint } from '../models/footprints.ts';
import { levelWriter, seenBuildings, type Editing } from './editing.ts';
import type { ChangedBuilding } from './register-edits.ts';

type Changed = {
  readonly kept: KeptBuilding;
  readonly state: BuildingState;
  readonly footprint: KeptFootprint | undefined;
  readonly before: Record<string, unknown>;
  readonly after: Record<string, unknown>;
};

/** What a history tells of a change, in this order. */
const TOLD = ['reference', ...BUILDING_FIELD_NAMES, 'area', 'groundLevelFrom'] as const;

function levelFrom(
  { kind }: Editing,
  kept: KeptBuilding,
  { attributes, groundLevelFrom }: ChangedBuilding,
): GroundLevelFrom | null {
  if (groundLevelFrom !== undefined) return groundLevelFrom;
  const level = attributes?.groundLevel;
  // what is taken back tells of it where it had changed
  if (level === undefined || kind === 'undo') return kept.groundLevelFrom;
  return level === null ? null : levelWriter(kind);
}

function changedState(
  editing: Editing,
  kept: KeptBuilding,
  edit: ChangedBuilding,
  placed: ReturnType<typeof placedFootprint> | undefined,
): BuildingState {
  const { attributes } = edit;
  const { west, south, east, north } = placed?.bounds ?? kept;
  return {
    reference: edit.reference ?? kept.reference,
    ...eachField((field) => {
      const value = attributes?.[field];
      return value === undefined ? kept[field] : value;
    }),
    groundLevelFrom: levelFrom(editing, kept, edit),
    imported: edit.imported ?? kept.imported,
    area: placed === undefined ? kept.area : footprintArea(placed.footprint),
    ...{ west, south, east, north },
  };
}

function changed(
  editing: Editing,
  kept: KeptBuilding,
  edit: ChangedBuilding,
  old: FootprintRings | undefined,
): Changed {
  const reference = edit.reference ?? kept.reference;
  const placed = edit.footprint && placedFootprint(reference, edit.footprint, editing.place);
  const isMoved = placed !== undefined && !isDeepStrictEqual(placed.footprint, old);
  const state = changedState(editing, kept, edit, isMoved ? placed : undefined);
  const told = TOLD.filter((name) => state[name] !== kept[name]);
  const footprint = isMoved ? { id: kept.id, ...placed } : undefined;
  return {
    kept,
    state,
    footprint,
    before: {
      ...Object.fromEntries(told.map((name) => [name, kept[name]])),
      ...(isMoved && { footprint: old }),
    },
    after: {
      ...Object.fromEntries(told.map((name) => [name, state[name]])),
      ...(isMoved && { footprint: placed.footprint }),
    },
  };
}

/** Writes what is new, each building as its next version; one in which nothing is new stays as it is. */
async function write(editing: Editing, rows: readonly Changed[]): Promise<void> {
  const { database, changeId, transaction } = editing;
  const isNew = ({ after }: Changed) => Object.keys(after).length > 0;
  const isToldAnew = ({ kept, state }: Changed) =>
    !isDeepStrictEqual(state.imported, kept.imported);
  const states = rows
    .filter((row) => isNew(row) || isToldAnew(row))
    .map((row) => {
      const { id, version } = row.kept;
      return { id, version: isNew(row) ? version + 1 : version, ...row.state };
    });
  await updateBuildingStates(database, states, transaction);
  const footprints = rows.flatMap(({ footprint }) => (footprint === undefined ? [] : [footprint]));
  await writeFootprints(database, footprints, transaction);
  const changes = rows.filter(isNew).map((row) => {
    const { kept, state, before, after } = row;
    // what the file had said goes back with the rest when the change is undone
    const told = isToldAnew(row);
    return {
      buildingId: kept.id,
      version: kept.version + 1,
      before: told ? { ...before, imported: kept.imported } : before,
      after: told ? { ...after, imported: state.imported } : after,
    };
  });
  await insertBuildingChanges(database, changeId, changes, transaction);
}

/** Changes some buildings, each on top of the version that was seen. */
export async function changeBuildings(
  editing: Editing,
  edits: readonly ChangedBuilding[],
): Promise<number[]> {
  const kept = await seenBuildings(editing, edits, false);
  const moved = edits.filter(({ footprint }) => footprint !== undefined).map(({ id }) => id);
  const { database, transaction } = editing;
  const old = await findFootprints(database, moved, transaction);
  const byId = new Map(kept.map((building) => [building.id, building]));
  const rows = edits.flatMap((edit) => {
    const building = byId.get(edit.id);
    return building === undefined ? [] : [changed(editing, building, edit, old.get(edit.id))];
  });
  await write(editing, rows);
  return edits.map(({ id }) => id);
}
