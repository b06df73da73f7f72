import { boundingBox, type Box } from '../../shared/geometry/bounding-box.ts';
import type { ImportOptions } from '../../shared/schemas/imports.ts';
import { givePoints } from '../importers/point-columns.ts';
import type { UploadRow } from '../importers/upload.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { checkFootprint } from './check-footprint.ts';
import type { Crowd } from './crowd.ts';
import { footprintHash } from './footprint-hash.ts';
import type { FootprintStore } from './footprint-store.ts';
import { looksLikeDegrees } from './looks-like-degrees.ts';
import type { Numbering } from './numbering.ts';
import { eachCorner, type Placement } from './placement.ts';
import { readReference, readValues, type ReadValues } from './read-values.ts';
import { REMARKS } from './remarks.ts';

/** What a check of a whole file remembers from row to row. */
export type CheckMemory = {
  readonly options: ImportOptions;
  /** Undefined where the file has values only. */
  readonly placement: Placement | undefined;
  readonly crowd: Crowd;
  readonly numbering: Numbering;
  readonly references: Map<string, number>;
  readonly footprints: FootprintStore;
};

/** A footprint on its way into the register. */
export type JudgedFootprint = {
  readonly footprint: FootprintRings;
  /** Null where it cannot be laid on the map. */
  readonly lonLat: FootprintRings | null;
  readonly box: Box | null;
  readonly area: number | null;
  readonly hash: string;
};

export type JudgedRow = {
  readonly row: number;
  readonly reference: string | null;
  readonly isRefused: boolean;
  readonly remarks: readonly string[];
  readonly values: ReadValues['values'];
  readonly drawn: JudgedFootprint | null;
  readonly isMended: boolean;
  /** Its values give a point, where footprints are wanted or known. */
  readonly isPoint: boolean;
};

type Drawn = Pick<JudgedRow, 'drawn' | 'isRefused' | 'isMended' | 'remarks'>;

const NOT_DRAWN = { drawn: null, isRefused: true, isMended: false } as const;

/** No building is as wide, in degrees: one that seems to be lies on both sides of the date line. */
const HALF_WAY_ROUND = 180;

function middleOf({ west, south, east, north }: Box): readonly [number, number] {
  return [(west + east) / 2, (south + north) / 2];
}

/** Why a footprint does not lie where it should; undefined where it does. */
function placeFault(
  { placement, crowd }: CheckMemory & { readonly placement: Placement },
  geometry: FootprintRings,
  grid: readonly [number, number],
  lonLat: readonly [number, number],
): string | undefined {
  const isOutside = !placement.isInArea(lonLat);
  const distance = crowd.distance(grid);
  if (!isOutside && distance === 0) return undefined;
  const [x, y] = geometry[0]?.[0]?.[0] ?? [NaN, NaN];
  const exchanged = placement.toGrid([y, x]);
  const isRight = placement.isInArea(placement.toLonLat(exchanged));
  if (isRight && crowd.distance(exchanged) === 0) return REMARKS.exchanged;
  const { name } = placement.isInArea(lonLat) ? placement.file : placement.scheme;
  // the rest lies outside with it
  if (isRight && distance === 0) return REMARKS.allExchanged(name);
  return isOutside ? REMARKS.outside(name) : REMARKS.far(distance);
}

function laidOnMap(footprint: FootprintRings, { toLonLat }: Placement) {
  const lonLat = eachCorner(footprint, toLonLat);
  const points = lonLat.flat(2);
  const isPlaced = points.every(([x, y]) => Number.isFinite(x) && Number.isFinite(y));
  return isPlaced ? { lonLat, box: boundingBox(points) } : { lonLat: null, box: null };
}

function drawFootprint(memory: CheckMemory, geometry: FootprintRings, row: number): Drawn {
  const { placement, options, footprints } = memory;
  if (placement === undefined) return { ...NOT_DRAWN, remarks: [] };
  const placed = eachCorner(geometry, placement.toGrid);
  if (placed.flat(2).some(([x, y]) => !Number.isFinite(x) || !Number.isFinite(y))) {
    return { ...NOT_DRAWN, remarks: [REMARKS.unplaced(placement.scheme.name)] };
  }
  const checked = checkFootprint(placed, options.mend);
  const { footprint, area, isMended } = checked;
  if (checked.isRefused && !placement.file.isInDegrees && looksLikeDegrees(geometry)) {
    return { ...NOT_DRAWN, remarks: [REMARKS.degrees] };
  }
  if (footprint === undefined) return { ...NOT_DRAWN, remarks: checked.remarks };
  const onMap = laidOnMap(footprint, placement);
  const drawn = { footprint, area, ...onMap, hash: footprintHash(footprint) };
  if (onMap.box === null) {
    return { ...NOT_DRAWN, isMended, remarks: [REMARKS.unplaced(placement.scheme.name)] };
  }
  if (onMap.box.east - onMap.box.west > HALF_WAY_ROUND) {
    return { ...NOT_DRAWN, isMended, remarks: [REMARKS.acrossDateLine] };
  }
  const grid = middleOf(boundingBox(footprint.flat(2)));
  const fault = placeFault({ ...memory, placement }, geometry, grid, middleOf(onMap.box));
  if (fault !== undefined) return { drawn, isRefused: true, isMended, remarks: [fault] };
  const twin = checked.isRefused ? undefined : footprints.twinOf(footprint);
  if (twin !== undefined && twin !== row) {
    return { drawn, isRefused: true, isMended, remarks: [...checked.remarks, REMARKS.sameFootprint(twin)] }; // prettier-ignore
  }
  return { drawn, isRefused: checked.isRefused, isMended, remarks: checked.remarks };
}

function draw(memory: CheckMemory, { row, geometry, fault }: UploadRow): Drawn {
  if (fault !== null) return { ...NOT_DRAWN, remarks: [fault] };
  if (memory.placement === undefined) return { ...NOT_DRAWN, isRefused: false, remarks: [] };
  if (geometry === null) return { ...NOT_DRAWN, remarks: [REMARKS.noFootprint] };
  return drawFootprint(memory, geometry, row);
}

/** The reference of a row, given by the file or counted; a second one of the same name is at fault. */
function refer(memory: CheckMemory, { row, properties }: UploadRow, { drawn, isRefused }: Drawn) {
  const { options, references, numbering } = memory;
  const column = options.columns.reference;
  if (column === undefined) {
    const reference = isRefused ? null : numbering.next(drawn?.hash ?? null);
    return { reference, remarks: [] };
  }
  const read = readReference(properties, column);
  if ('fault' in read) return { reference: read.reference, remarks: [read.fault] };
  const { reference } = read;
  const first = references.get(reference);
  if (first === undefined) references.set(reference, row);
  else return { reference, remarks: [REMARKS.sameReference(reference, first)] };
  return { reference, remarks: [] };
}

/** Looks at a row by itself and against the rows before it, not yet against the register. */
export function judgeRow(memory: CheckMemory, staged: UploadRow): JudgedRow {
  const { row } = staged;
  const drawing = draw(memory, staged);
  const referring = refer(memory, staged, drawing);
  const reading = readValues(staged.properties, memory.options.columns);
  const isRefused = drawing.isRefused || referring.remarks.length > 0;
  if (!isRefused && drawing.drawn !== null) memory.footprints.add(row, drawing.drawn.footprint);
  return {
    row,
    reference: referring.reference,
    isRefused,
    remarks: [...drawing.remarks, ...referring.remarks, ...reading.remarks],
    values: reading.values,
    drawn: drawing.drawn,
    isMended: drawing.isMended,
    isPoint: memory.placement === undefined && givePoints(Object.keys(staged.properties)),
  };
}
