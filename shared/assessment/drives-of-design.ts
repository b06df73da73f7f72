import { chainages } from '../geometry/chainages.ts';
import { offsetPolyline } from '../geometry/offset-polyline.ts';
import { pointAtChainage } from '../geometry/point-at-chainage.ts';
import type { SpacePoint } from '../geometry/point.ts';
import type { Drive, DriveInterval } from '../ground/drive.ts';
import { at } from '../numerics/at.ts';
import { interpolate } from '../numerics/interpolate.ts';
import { intervalIndex } from '../numerics/interval-index.ts';
import { MethodError } from '../method-error.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import { axisLevelAt } from './axis-level-at.ts';
import { boresOfDesign, type Bore } from './bores-of-design.ts';

/** Stations nearer to each other are one, or a part of the axis would have no length. */
const SAME_STATION = 0.001;

/** From chainage along the drawn line to chainage along a bore beside it, part by part in proportion. */
function alongBore(line: Float64Array, bore: Float64Array): (chainage: number) => number {
  return (chainage) => {
    const index = intervalIndex(line, chainage);
    const [from, to] = [at(line, index), at(line, index + 1)];
    const share = Math.min(1, Math.max(0, (chainage - from) / (to - from)));
    return interpolate(at(bore, index), at(bore, index + 1), share);
  };
}

/** Where the line bends or its level does, in order. */
function stationsOf(line: Float64Array, levels: AlignmentDesign['levels']): number[] {
  const end = at(line, line.length - 1);
  const between = levels.flatMap(({ chainage }, k) => {
    const isNew = chainage - (levels[k - 1]?.chainage ?? -1) > SAME_STATION;
    const isOwn = line.every((vertex) => Math.abs(vertex - chainage) > SAME_STATION);
    return chainage < end && isNew && isOwn ? [chainage] : [];
  });
  return [...line, ...between].sort((a, b) => a - b);
}

function turnedInterval(interval: DriveInterval, length: number): DriveInterval {
  return { ...interval, from: length - interval.to, to: length - interval.from };
}

/** Runs something whose faults name a vertex as `[3]`, and names it as the design does: `line.3`. */
function namingVertices<T>(run: () => T): T {
  try {
    return run();
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    const vertex = /^\[(\d+)\]$/.exec(error.field ?? '')?.[1];
    throw new MethodError(
      error.code,
      error.message,
      vertex === undefined ? 'line' : `line.${vertex}`,
    );
  }
}

function stationedLine(line: readonly SpacePoint[]): Float64Array {
  const stations = chainages(line);
  const short = stations.findIndex(
    (station, k) => k > 0 && station - at(stations, k - 1) <= SAME_STATION,
  );
  if (short === -1) return stations;
  const message = `Vertex ${short} lies within a millimetre of vertex ${short - 1}.`;
  throw new MethodError('zero-length', message, `[${short}]`);
}

function driveOf(design: AlignmentDesign, bore: Bore): Drive {
  const flat = design.line.map(([e, n]): SpacePoint => [e, n, 0]);
  const line = stationedLine(flat);
  const moved = bore.offset === 0 ? flat : offsetPolyline(flat, bore.offset);
  const own = bore.offset === 0 ? line : stationedLine(moved);
  const along = alongBore(line, own);
  const axis = stationsOf(line, design.levels).map((station): SpacePoint => {
    const [e, n] = pointAtChainage(moved, own, along(station));
    return [e, n, axisLevelAt(design.levels, station)];
  });
  const length = at(own, own.length - 1);
  const intervals = design.intervals
    .map(({ from, to, ...inputs }) => ({ ...inputs, from: along(from), to: along(to) }))
    .filter(({ from, to }) => from < to);
  const isBackward = design.direction === 'backward';
  return {
    name: bore.name,
    axis: isBackward ? axis.reverse() : axis,
    diameter: design.diameter,
    volumeLoss: design.volumeLoss,
    troughWidth: design.troughWidth,
    intervals: isBackward
      ? intervals.map((interval) => turnedInterval(interval, length)).reverse()
      : intervals,
    faceShare: 0.5,
    laterFactor: bore.laterFactor,
    groundLevels: [{ chainage: 0, level: design.groundLevel }],
  };
}

/**
 * The drives of a designed alignment in the order of driving: the line itself, or two bores beside it,
 * each with its levels, its intervals by its own chainage and its direction.
 *
 * Units: m. Valid: throws, with `line.3` or `line` as the field, `outside-range` where the spacing leaves
 * nothing of a part of the line and `zero-length` where two points coincide; what lies past the end of
 * the line is left out. Left and right are those of the line as it was drawn, whichever way it is driven.
 * Source: [own].
 */
export function drivesOfDesign(design: AlignmentDesign): Drive[] {
  return namingVertices(() => boresOfDesign(design).map((bore) => driveOf(design, bore)));
}
