import { drivesOfDesign } from '../../../shared/assessment/drives-of-design.ts';
import { chainages } from '../../../shared/geometry/chainages.ts';
import { offsetPolyline } from '../../../shared/geometry/offset-polyline.ts';
import { pointInPolygon } from '../../../shared/geometry/point-in-polygon.ts';
import { pointAtChainage } from '../../../shared/geometry/point-at-chainage.ts';
import type { SpacePoint } from '../../../shared/geometry/point.ts';
import {
  CONTOUR_LEVELS,
  type SettlementContour,
} from '../../../shared/ground/settlement-contours.ts';
import { MethodError } from '../../../shared/method-error.ts';
import type { AlignmentDesign, Shafts } from '../../../shared/schemas/alignments.ts';
import type { LineShape } from '../map/map-line.ts';
import type { GridPlace } from '../map/place/grid-projection.ts';
import { chainageWords } from '../../../shared/presentation/chainage-words.ts';

type GridRing = readonly GridPlace[];

const TICK_STEP = 100;
/** How far a tick stands out beyond the outer edge of the drives, and its label beyond it. */
const [BEYOND, LABEL_BEYOND] = [10, 7];

function flat(line: readonly SpacePoint[]): GridPlace[] {
  return line.map(([east, north]) => [east, north]);
}

/** A line beside another; none where nothing is left of it. */
function beside(axis: readonly SpacePoint[], offset: number): LineShape[] {
  try {
    return [{ kind: 'edge', places: flat(offsetPolyline(axis, offset)) }];
  } catch (error) {
    if (error instanceof MethodError) return [];
    throw error;
  }
}

function driveShapes(design: AlignmentDesign): LineShape[] {
  return drivesOfDesign(design).flatMap(({ axis, diameter }): LineShape[] => [
    ...beside(axis, diameter / 2),
    ...beside(axis, -diameter / 2),
    { kind: 'axis', places: flat(axis) },
  ]);
}

/** A point beside a line, positive to the left. */
export function placeBeside(
  line: readonly SpacePoint[],
  stations: Float64Array,
  chainage: number,
): (offset: number) => GridPlace {
  const end = stations.at(-1) ?? 0;
  const [from, to] = [chainage - 0.5, chainage + 0.5].map((at) =>
    pointAtChainage(line, stations, Math.min(end, Math.max(0, at))),
  );
  const [east, north] = pointAtChainage(line, stations, chainage);
  const [dx, dy] = [(to?.[0] ?? 0) - (from?.[0] ?? 0), (to?.[1] ?? 0) - (from?.[1] ?? 0)];
  const length = Math.hypot(dx, dy) || 1;
  return (offset) => [east - (offset * dy) / length, north + (offset * dx) / length];
}

function tickShapes({ line, bores, diameter }: AlignmentDesign): LineShape[] {
  const axis = line.map(([east, north]): SpacePoint => [east, north, 0]);
  const stations = chainages(axis);
  const end = stations.at(-1) ?? 0;
  const half = diameter / 2 + BEYOND + (bores.kind === 'twin' ? bores.spacing / 2 : 0);
  const count = Math.floor(end / TICK_STEP) + 1;
  return Array.from({ length: count }, (_, k) => k * TICK_STEP).flatMap((chainage): LineShape[] => {
    const at = placeBeside(axis, stations, chainage);
    return [
      { kind: 'tick', places: [at(half), at(-half)] },
      { kind: 'chainage', place: at(-half - LABEL_BEYOND), text: chainageWords(chainage) },
    ];
  });
}

/** Axes and edges of the drives and the chainages of the line; nothing where the drives cannot follow it. */
export function shapesOfDesign(design: AlignmentDesign): LineShape[] {
  try {
    return [...driveShapes(design), ...tickShapes(design)];
  } catch (error) {
    if (error instanceof MethodError) return [];
    throw error;
  }
}

/** The middle of each shaft, with its name. */
export function shapesOfShafts(shafts: Shafts): LineShape[] {
  return shafts.map(({ name, east, north }) => ({
    kind: 'shaft',
    place: [east, north],
    text: name,
  }));
}

const MILLIMETRES = 1000;

/** What the outermost contours enclose; one inside of another is a hole in it. */
function bandShapes(contours: readonly SettlementContour[]): LineShape[] {
  const [outermost = 0] = CONTOUR_LEVELS;
  const rings = contours.flatMap(({ level, line }) => (level === outermost ? [line] : []));
  const isInside = (ring: GridRing, other: GridRing) =>
    ring !== other && ring[0] !== undefined && pointInPolygon(ring[0], [other]);
  const isHole = (ring: GridRing) => rings.some((other) => isInside(ring, other));
  return rings
    .filter((ring) => !isHole(ring))
    .map((ring) => ({
      kind: 'band',
      rings: [ring, ...rings.filter((other) => isInside(other, ring))],
    }));
}

/** Lines of equal settlement, and lightly where it reaches. */
export function shapesOfContours(contours: readonly SettlementContour[]): LineShape[] {
  const lines = contours.map(({ level, line }): LineShape => ({
    kind: 'contour',
    level: Math.round(level * MILLIMETRES),
    places: line,
  }));
  return [...bandShapes(contours), ...lines];
}
