import { BUILDING_FIELD_NAMES, type BuildingValue } from '../../shared/schemas/building-fields.ts';
import type { ImportOptions, ImportRow } from '../../shared/schemas/imports.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { CheckedRow, Taking } from '../models/checked-rows.ts';
import type { KnownBuilding, RemovedBuilding } from '../models/known-buildings.ts';
import { mergeBuilding, type Merged, type MergeValues } from '../register/merge-building.ts';
import { cleanRings } from './clean-rings.ts';
import { footprintHash } from './footprint-hash.ts';
import type { JudgedRow } from './judge-row.ts';
import { REMARKS } from './remarks.ts';
import { isSameFootprint } from './same-footprint.ts';
import { isToldBefore, withOutline } from './told-footprint.ts';

type Joining = {
  readonly settle: ImportOptions['settle'];
  /** Whether rows without a building of the register are new ones. */
  readonly mayCreate: boolean;
  /** What somebody took out of the register, by reference. */
  readonly removed: ReadonlyMap<string, RemovedBuilding>;
  /** The footprints that buildings had before, by their numbers. */
  readonly earlier: ReadonlyMap<number, readonly FootprintRings[]>;
};

function settling({ others, rows }: ImportOptions['settle'], reference: string) {
  return Object.hasOwn(rows, reference) ? (rows[reference] ?? others) : others;
}

/** What the file says, by field; of its footprint the hash. */
function said({ values, drawn }: JudgedRow): MergeValues {
  return { ...values, ...(drawn !== null && { footprint: drawn.hash }) };
}

/**
 * The same, where figures that a format rounds are no change: neither of what the register holds, nor of
 * what the last file said where a hand has drawn otherwise since.
 */
function saidAgainst(
  row: JudgedRow,
  building: KnownBuilding,
  ours: MergeValues,
  clean: FootprintRings | undefined,
  earlier: readonly FootprintRings[],
): MergeValues {
  const { drawn } = row;
  const base = building.imported.footprint;
  if (clean === undefined || drawn === null || drawn.hash === base) return said(row);
  if (isSameFootprint(clean, drawn.footprint)) {
    return { ...said(row), footprint: ours.footprint ?? null };
  }
  const isOld = base !== undefined && isToldBefore(drawn.footprint, building, earlier);
  return isOld ? { ...said(row), footprint: base } : said(row);
}

function cleanFootprint({ footprint }: KnownBuilding): FootprintRings | undefined {
  return footprint === null ? undefined : cleanRings(footprint);
}

/** What the register holds. A level taken from the scheme's ground is nobody's word. */
function held(building: KnownBuilding, clean: FootprintRings | undefined): MergeValues {
  const { groundLevelFrom } = building;
  const values: Record<string, BuildingValue> = {};
  for (const field of BUILDING_FIELD_NAMES) values[field] = building[field];
  if (groundLevelFrom === 'ground') values.groundLevel = null;
  if (clean !== undefined) values.footprint = footprintHash(clean);
  return values;
}

/** Changes as people read them: of footprints their areas. */
function told(merged: Merged, row: JudgedRow, building: KnownBuilding): ImportRow['changes'] {
  return merged.fields.map((field) => {
    if (field.field !== 'footprint') return { ...field };
    return { ...field, ours: building.area, theirs: row.drawn?.area ?? null };
  });
}

function takenValues(merged: Merged): Taking['attributes'] {
  const taken = merged.fields.filter(({ field, isKept }) => !isKept && field !== 'footprint');
  return Object.fromEntries(taken.map(({ field, theirs }) => [field, theirs]));
}

function isToldAnew(imported: Taking['imported'], building: KnownBuilding): boolean {
  return Object.entries(imported).some(([field, value]) => building.imported[field] !== value);
}

function base({ row, reference, remarks, drawn, isMended }: JudgedRow) {
  return {
    ...{ row, reference, isMended },
    remarks: [...remarks],
    footprint: drawn?.footprint ?? null,
    lonLat: drawn?.lonLat ?? null,
    box: drawn?.box ?? null,
    area: drawn?.area ?? null,
  };
}

function refusedRow(row: JudgedRow, more: readonly string[], id: number | null): CheckedRow {
  const kept = base(row);
  const remarks = [...kept.remarks, ...more];
  return { ...kept, remarks, outcome: 'refused', changes: [], buildingId: id, taking: null };
}

function newRow(row: JudgedRow, removed: RemovedBuilding | undefined): CheckedRow {
  const known = Object.entries(row.values).filter(([, value]) => value !== null);
  const taking: Taking = {
    attributes: Object.fromEntries(known),
    takesFootprint: true,
    imported: said(row),
    version: null,
  };
  const kept = base(row);
  const remarks = [...kept.remarks, ...(removed === undefined ? [] : [REMARKS.removed(removed)])];
  return { ...kept, remarks, outcome: 'new', changes: [], buildingId: null, taking };
}

/** What is kept of what the file said; an outline that is not taken stands nowhere else. */
function remembered({ fields, imported }: Merged, { drawn }: JudgedRow): Taking['imported'] {
  const isLeft = fields.some(({ field, isConflict, isKept }) => field === 'footprint' && isConflict && isKept); // prettier-ignore
  return isLeft && drawn !== null ? withOutline(imported, drawn.footprint) : imported;
}

function mergedRow(row: JudgedRow, building: KnownBuilding, joining: Joining): CheckedRow {
  const clean = cleanFootprint(building);
  const ours = held(building, clean);
  const earlier = joining.earlier.get(building.id) ?? [];
  const merged = mergeBuilding({
    ours,
    base: building.imported,
    theirs: saidAgainst(row, building, ours, clean, earlier),
    settle: settling(joining.settle, building.reference),
  });
  const imported = remembered(merged, row);
  const taking: Taking = {
    attributes: takenValues(merged),
    takesFootprint: merged.fields.some(({ field, isKept }) => field === 'footprint' && !isKept),
    imported,
    version: building.version,
  };
  const isTaken = merged.outcome !== 'same' || isToldAnew(imported, building);
  return {
    ...base(row),
    outcome: merged.outcome,
    changes: told(merged, row, building),
    buildingId: building.id,
    taking: isTaken ? taking : null,
  };
}

/** What becomes of a row that was looked at: it is refused, new, or joined with its building. */
export function joinRow(
  row: JudgedRow,
  building: KnownBuilding | undefined,
  joining: Joining,
): CheckedRow {
  const { reference } = row;
  if (row.isRefused || reference === null) return refusedRow(row, [], building?.id ?? null);
  if (building !== undefined) return mergedRow(row, building, joining);
  if (joining.mayCreate) return newRow(row, joining.removed.get(reference));
  return refusedRow(row, [REMARKS.noSuchBuilding(reference, row.isPoint)], null);
}
