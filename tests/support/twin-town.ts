import proj4 from 'proj4';
import { polygonArea } from '../../shared/geometry/polygon-area.ts';

type Point = readonly [number, number];
type Ring = readonly Point[];
export type Parts = readonly (readonly Ring[])[];

/** A building of an invented town with the quirks of cadastre data: every attribute is a text or blank. */
export type TwinRow = {
  readonly parts: Parts;
  /** Height of its ground, for formats that have three coordinates. */
  readonly height: number;
  readonly attributes: Readonly<Record<string, string | null>>;
};

const [WEST, SOUTH, STEP] = [352_000, 4_436_800, 14];
const COUNT = 48;
const UTM_30 = '+proj=utm +zone=30 +ellps=GRS80 +towgs84=0,0,0,0,0,0,0 +units=m +no_defs';

/** Anticlockwise and closed. */
function rectangle(x: number, y: number, width: number, depth: number): Ring {
  return [[x, y], [x + width, y], [x + width, y + depth], [x, y + depth], [x, y]]; // prettier-ignore
}

function hole(x: number, y: number, width: number, depth: number): Ring {
  return [...rectangle(x, y, width, depth)].reverse();
}

function partsOf(index: number): Parts {
  const [x, y] = [WEST + STEP * (index % 8), SOUTH + 30.25 * Math.floor(index / 8)];
  // as wide as a plot, so that neighbours share a wall
  const plain = rectangle(x, y, STEP, 9.5);
  switch (index % 6) {
    case 1:
      return [[[[x, y], [x + STEP, y], [x + STEP, y + 5], [x + 6, y + 5.5], [x + 6, y + 12], [x, y + 12], [x, y]]]]; // prettier-ignore
    case 2:
      return [[plain, hole(x + 3, y + 3, 4, 3), hole(x + 9, y + 3, 2, 2)]];
    case 3:
      return [[rectangle(x, y, 5, 8)], [rectangle(x + 8, y + 1, 4, 4)]];
    case 4:
      // a court with a house in it
      return [[rectangle(x, y, STEP, 20), hole(x + 2, y + 2, 10, 16)], [rectangle(x + 5, y + 8, 3, 4)]]; // prettier-ignore
    default:
      return [[plain]];
  }
}

/** The town in EPSG:25830; its last row repeats its first. */
export function twinTown(): readonly TwinRow[] {
  const rows = Array.from({ length: COUNT }, (_, index): TwinRow => ({
    parts: partsOf(index),
    height: 430 + (index % 7) * 0.75,
    attributes: {
      reference: `20694${String(index).padStart(2, '0')}UK5326N`,
      use: index % 9 === 4 ? null : '1_residential',
      storeys: index % 5 === 0 ? '2,0' : String(1 + (index % 4)),
      street: index % 2 === 0 ? 'Calle del Muñón, «bajo»' : 'Plaza "Mayor"; nº 3\nfondo',
      year: `19${String(10 + index)}-01-01T00:00:00`,
    },
  }));
  return [...rows, ...rows.slice(0, 1)];
}

const place = proj4(UTM_30);

function eachPoint(parts: Parts, change: (point: Point) => Point): Parts {
  return parts.map((part) => part.map((ring) => ring.map(change)));
}

/** The same town in longitude and latitude, to nine decimals. */
export function inDegrees(rows: readonly TwinRow[]): readonly TwinRow[] {
  const round = (value: number) => Math.round(value * 1e9) / 1e9;
  return rows.map((row) => ({
    ...row,
    parts: eachPoint(row.parts, ([x, y]) => {
      const [longitude, latitude] = place.inverse([x, y]);
      return [round(longitude), round(latitude)];
    }),
  }));
}

/** Square metres of parts, their holes taken off; degrees are brought to EPSG:25830 first. */
export function areaOf(parts: Parts): number {
  const isDegrees = Math.abs(parts[0]?.[0]?.[0]?.[0] ?? 0) < 180;
  const metres = isDegrees
    ? eachPoint(parts, ([x, y]) => {
        const [east, north] = place.forward([x, y]);
        return [east, north];
      })
    : parts;
  return metres.reduce((sum, part) => {
    const [outer = 0, ...holes] = part.map((ring) => Math.abs(polygonArea(ring)));
    return sum + outer - holes.reduce((all, area) => all + area, 0);
  }, 0);
}
