import { difference, intersection } from 'polyclip-ts';
import { partArea } from '../../shared/building/footprint-area.ts';
import { pointInPolygon } from '../../shared/geometry/point-in-polygon.ts';
import type { Segment } from '../../shared/geometry/point.ts';
import { polygonEdges } from '../../shared/geometry/polygon-edges.ts';
import { segmentsCross } from '../../shared/geometry/segment-distance.ts';
import { AppError } from '../errors.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { clipped } from './clipped.ts';

type Point = readonly [number, number];

/** Ways out from an end of the line that are tried, and how far out. */
const WAYS = 72;
const FAR = 1e5;
const LEAST_AREA = 1;

function refusal(message: string): AppError {
  return new AppError('invalid-input', message, [{ path: 'line', message }]);
}

function towards([x, y]: Point, angle: number): Point {
  return [x + FAR * Math.cos(angle), y + FAR * Math.sin(angle)];
}

function segmentsOf(line: readonly Point[]): Segment[] {
  return line.slice(1).map((end, k) => ({ start: line[k] ?? end, end }));
}

/** A direction in which one gets away from an end of the line without meeting the building or the line. */
function wayOut(end: Point, before: Point, obstacles: readonly Segment[]): number {
  const straight = Math.atan2(end[1] - before[1], end[0] - before[0]);
  for (let k = 0; k < WAYS; k += 1) {
    // straight on first, then ever more to either side
    const turn = (Math.ceil(k / 2) * (k % 2 === 0 ? 1 : -1) * 2 * Math.PI) / WAYS;
    const way = { start: end, end: towards(end, straight + turn) };
    if (!obstacles.some((obstacle) => segmentsCross(way, obstacle))) return straight + turn;
  }
  throw refusal('Draw the line on until it ends outside the building, not in a courtyard.');
}

/** The line closed far round one side of the building. */
function halfPlane(line: readonly Point[], footprint: FootprintRings): Point[] {
  const [first, second] = line;
  const [last, beforeLast] = [line.at(-1), line.at(-2)];
  if (!first || !second || !last || !beforeLast)
    throw refusal('Draw a line of two points at least.');
  const own = segmentsOf(line);
  const edges = footprint.flat().flatMap((ring) => polygonEdges(ring));
  const out = wayOut(last, beforeLast, [...edges, ...own]);
  const outWay = { start: last, end: towards(last, out) };
  const back = wayOut(first, second, [...edges, ...own, outWay]);
  const turn = (((back - out) % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);
  const round = Array.from({ length: WAYS - 1 }, (_, k) =>
    towards(last, out + (turn * (k + 1)) / WAYS),
  );
  return [...line, outWay.end, ...round, towards(first, back), first];
}

function crosses(line: readonly Point[], part: FootprintRings[number]): boolean {
  const edges = part.flatMap((ring) => polygonEdges(ring));
  return segmentsOf(line).some((one) => edges.some((edge) => segmentsCross(one, edge)));
}

/**
 * The pieces of a footprint that a line cuts, the largest first; parts that the line does not meet stay
 * with the largest.
 */
export function splitFootprint(
  footprint: FootprintRings,
  line: readonly Point[],
): FootprintRings[] {
  const ends = [line[0], line.at(-1)];
  if (ends.some((end) => end && footprint.some((part) => pointInPolygon(end, part)))) {
    throw refusal('Begin and end the line outside the building.');
  }
  const met = footprint.filter((part) => crosses(line, part));
  const side = [[halfPlane(line, footprint)]];
  const pieces = met.flatMap((part) => [
    ...clipped(intersection, [part], side),
    ...clipped(difference, [part], side),
  ]);
  if (met.length === 0 || pieces.length <= met.length) {
    throw refusal('The line does not cut the building in two.');
  }
  const [largest, ...others] = pieces.sort((a, b) => partArea(b) - partArea(a));
  if (others.some((piece) => partArea(piece) < LEAST_AREA)) {
    throw refusal('A piece would be smaller than 1 m². Draw the line farther in.');
  }
  const whole = footprint.filter((part) => !met.includes(part));
  return [[...(largest === undefined ? [] : [largest]), ...whole], ...others.map((part) => [part])];
}
