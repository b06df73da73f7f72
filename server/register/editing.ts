import type { Sequelize, Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import {
  findBuildingStates,
  type BuildingState,
  type KeptBuilding,
} from '../models/building-state.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { GroundLevelFrom } from '../models/building.ts';
import { BUILDING_FIELD_NAMES } from '../../shared/schemas/building-fields.ts';
import type { RegisterChangeKind } from '../models/register-change.ts';
import type { VersionedBuilding } from './register-edits.ts';

type Point = readonly [number, number];

/** What a change of a register works with while it lasts. */
export type Editing = {
  readonly database: Sequelize;
  readonly transaction: Transaction;
  readonly schemeId: string;
  readonly changeId: string;
  readonly kind: RegisterChangeKind;
  /** From the scheme's grid to longitude and latitude. */
  readonly place: (point: Point) => Point;
  /** The level of the scheme's ground under a footprint, where it has one. */
  readonly groundUnder: (footprint: FootprintRings) => Promise<number | null>;
};

const NAMED = 5;

/** Who is told to have come too late, by reference; a building that is not there any more by its number. */
function tooLate(references: readonly string[]): AppError {
  const others = references.length - NAMED;
  const named = references.slice(0, NAMED).join(', ') + (others > 0 ? ` and ${others} more` : '');
  const message = `Somebody else changed ${named} meanwhile. Load it again to see their change.`;
  return new AppError('conflict', message);
}

/** The buildings that are to be edited, or a refusal that names those that are not as they were seen. */
export async function seenBuildings(
  { database, schemeId, transaction }: Editing,
  edits: readonly VersionedBuilding[],
  isRemoved: boolean,
): Promise<KeptBuilding[]> {
  const ids = edits.map(({ id }) => id);
  const kept = await findBuildingStates(database, schemeId, ids, transaction);
  const late: string[] = [];
  const seen = edits.flatMap(({ id, version }) => {
    const building = kept.get(id);
    const isSeen = building?.version === version && building.isRemoved === isRemoved;
    if (!isSeen) late.push(building?.reference ?? `building ${id}`);
    return building === undefined ? [] : [building];
  });
  if (late.length > 0) throw tooLate(late);
  return seen;
}

/** What tells a history what a building is: everything known of it but its footprint. */
export function snapshot(state: BuildingState): Record<string, unknown> {
  const known = BUILDING_FIELD_NAMES.filter((field) => state[field] !== null);
  return {
    reference: state.reference,
    area: state.area,
    ...Object.fromEntries(known.map((field) => [field, state[field]])),
    ...(state.groundLevelFrom !== null && { groundLevelFrom: state.groundLevelFrom }),
  };
}

/** Where a ground level comes from that a change of some kind writes. */
export function levelWriter(kind: RegisterChangeKind): GroundLevelFrom {
  if (kind === 'import') return 'file';
  return kind === 'ground' ? 'ground' : 'hand';
}
