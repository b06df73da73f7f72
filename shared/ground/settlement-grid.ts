import { boundingBox, type Box } from '../geometry/bounding-box.ts';
import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { at } from '../numerics/at.ts';
import { exponential } from '../numerics/exponential.ts';
import { interpolate } from '../numerics/interpolate.ts';
import { SURFACE_SQUARE, type GroundSurface } from './ground-surface.ts';
import { FIELD } from './kernel.ts';

/**
 * Settlement at the nodes of a grid along the scheme's axes, row by row from the south.
 *
 * Units: m; NaN where the method refuses. Valid: zero along all its borders. Source: [own].
 */
export type SettlementGrid = {
  readonly columns: number;
  readonly rows: number;
  readonly spacing: number;
  readonly origin: PlanPoint;
  readonly values: number[];
};

/** In trough widths from a drive: how far to look at least and at most. */
const REACH = { least: 2, most: 5, step: 0.25 } as const;
/** How many times what settles above one drive may settle between several. */
const DRIVES_TOGETHER = 4;
const NODES_PER_WIDTH = 6;
const MOST_NODES = 3_000_000;
/** Where a drive comes up steeply its trough is all but a line, and no grid needs to show that. */
const LARGEST_SPREAD = 3;

type Part = GroundSurface['parts'][number];

/** In trough widths: beyond, settlement is under some level, as it falls off by φ across a drive. */
function reachOf(surface: GroundSurface, parts: readonly Part[], level: number): number {
  let largest = 0;
  for (const { plan } of parts) {
    const middle: PlanPoint = [
      interpolate(plan.start[0], plan.end[0], 0.5),
      interpolate(plan.start[1], plan.end[1], 0.5),
    ];
    const field = surface.at(middle);
    if (field !== undefined) largest = Math.max(largest, at(field, FIELD.settlement));
  }
  let reach: number = REACH.least;
  while (
    reach < REACH.most &&
    DRIVES_TOGETHER * largest * exponential(-(reach * reach) / 2) > level
  ) {
    reach += REACH.step;
  }
  return reach;
}

function boxOf(part: Part, widths: number): Box {
  const { west, south, east, north } = boundingBox([part.plan.start, part.plan.end]);
  const reach = widths * part.width;
  return { west: west - reach, south: south - reach, east: east + reach, north: north + reach };
}

/** The squares of the surface that a drive may reach, each by the column and row of its corner. */
function squaresNear(parts: readonly Part[], reach: number): [column: number, row: number][] {
  const found = new Map<string, [number, number]>();
  const square = (coordinate: number) => Math.floor(coordinate / SURFACE_SQUARE);
  for (const part of parts) {
    const { west, south, east, north } = boxOf(part, reach);
    const most = reach * part.width + SURFACE_SQUARE * Math.SQRT1_2;
    for (let column = square(west); column <= square(east); column++) {
      for (let row = square(south); row <= square(north); row++) {
        const middle: PlanPoint = [(column + 0.5) * SURFACE_SQUARE, (row + 0.5) * SURFACE_SQUARE];
        if (nearestOnSegment(middle, part.plan).distance > most) continue;
        found.set(`${column},${row}`, [column, row]);
      }
    }
  }
  return [...found.values()];
}

/** The nodes along one axis that lie in a square, the last one left to the next square; never a border. */
function nodesIn(corner: number, origin: number, spacing: number, count: number): number[] {
  const first = Math.max(1, Math.ceil((corner - origin) / spacing));
  const end = Math.min(count - 1, Math.ceil((corner + SURFACE_SQUARE - origin) / spacing));
  return Array.from({ length: Math.max(0, end - first) }, (_, k) => first + k);
}

/**
 * The point of a node of a grid.
 *
 * Units: m. Valid: any column and row. Source: [own].
 */
export function nodeAt(
  { origin, spacing }: SettlementGrid,
  column: number,
  row: number,
): PlanPoint {
  return [origin[0] + column * spacing, origin[1] + row * spacing];
}

/**
 * Settlement on a grid as fine as a sixth of the trough width and of at most 3 million nodes; so far
 * from every drive that it is under the level asked about, it is taken as zero.
 *
 * Units: m. Valid: undefined where there is no drive with a trough. Source: [own].
 */
export function settlementGrid(surface: GroundSurface, level: number): SettlementGrid | undefined {
  const parts = surface.parts.filter(({ width }) => width > 0);
  if (parts.length === 0) return undefined;
  const reach = reachOf(surface, parts, level);
  const boxes = parts.map((part) => boxOf(part, reach));
  const box = boundingBox(
    boxes.flatMap(({ west, south, east, north }): PlanPoint[] => [
      [west, south],
      [east, north],
    ]),
  );
  const [across, up] = [box.east - box.west, box.north - box.south];
  const widths = parts.map(({ width }) => width).sort((a, b) => a - b);
  const [narrowest, widest] = [widths[0] ?? 0, widths.at(-1) ?? 0];
  const wanted = Math.max(narrowest, widest / LARGEST_SPREAD) / NODES_PER_WIDTH;
  const spacing = Math.max(wanted, Math.sqrt((1.05 * across * up) / MOST_NODES));
  const [columns, rows] = [across, up].map((length) => Math.ceil(length / spacing) + 3);
  if (columns === undefined || rows === undefined) return undefined;
  const origin: PlanPoint = [box.west - spacing, box.south - spacing];
  const values = new Array<number>(columns * rows).fill(0);
  const grid = { columns, rows, spacing, origin, values };
  for (const [column, row] of squaresNear(parts, reach)) {
    const ofColumns = nodesIn(column * SURFACE_SQUARE, origin[0], spacing, columns);
    for (const j of nodesIn(row * SURFACE_SQUARE, origin[1], spacing, rows)) {
      for (const i of ofColumns) {
        const field = surface.at(nodeAt(grid, i, j));
        values[j * columns + i] = field === undefined ? NaN : at(field, FIELD.settlement);
      }
    }
  }
  return grid;
}
