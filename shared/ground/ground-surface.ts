import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import type { PlanPoint, Segment } from '../geometry/point.ts';
import { MethodError } from '../method-error.ts';
import { at } from '../numerics/at.ts';
import { atPosition } from '../numerics/range.ts';
import type { GroundModel } from './ground-model.ts';
import { FIELD_SIZE, PACK_STRIDE, sumPieces } from './kernel.ts';
import { levelField, type GroundState, type LevelField } from './level-field.ts';
import { placeOfFootprint } from './place.ts';
import { siteOf } from './site.ts';
import { troughWidth } from './trough-width.ts';
import { ruleAt } from './trough-width-rule.ts';

/**
 * The side of the squares, along the grid from its origin, by which a surface sorts out which pieces of
 * drive matter. Larger ones would each hear more of them.
 *
 * Units: m. Valid: a constant. Source: [own].
 */
export const SURFACE_SQUARE = 30;

/** Coordinates are under 1e8 m, so that a row of squares has at most 22 binary digits. */
const ROWS = 1 << 22;

/**
 * The movement of the ground at its surface, anywhere, and the drives that cause it.
 *
 * Units: `at` takes a point and gives FIELD_SIZE numbers as FIELD, the same array each time; widthAt m,
 * `parts` m with the largest trough width of each. Valid: made by `groundSurface`; undefined in a square
 * where the crown rule refuses, as where a drive comes out of the ground. Source: attewell-woodman-1982.
 */
export type GroundSurface = {
  readonly at: (point: PlanPoint) => Float64Array | undefined;
  readonly widthAt: (point: PlanPoint) => number | undefined;
  readonly parts: readonly { readonly plan: Segment; readonly width: number }[];
};

/** In trough widths: farther off in plan a part moves the ground by under 1e-9 of what it does at most. */
const REACH = 6.5;

/** The parts of a pack that reach a square; gradients have many that do not. */
function partsInReach(
  { pack, count }: LevelField['packs'][number],
  middle: PlanPoint,
): LevelField['packs'][number] {
  const kept = new Float64Array(count * PACK_STRIDE);
  let reached = 0;
  for (let o = 0; o < count * PACK_STRIDE; o += PACK_STRIDE) {
    const width = 1 / at(pack, o + 4);
    const length = at(pack, o + 5) * width;
    const start: PlanPoint = [at(pack, o), at(pack, o + 1)];
    const end: PlanPoint = [
      start[0] + length * at(pack, o + 2),
      start[1] + length * at(pack, o + 3),
    ];
    const most = REACH * width + SURFACE_SQUARE * Math.SQRT1_2;
    if (nearestOnSegment(middle, { start, end }).distance > most) continue;
    kept.set(pack.subarray(o, o + PACK_STRIDE), reached * PACK_STRIDE);
    reached += 1;
  }
  return { pack: kept, count: reached };
}

function fieldOfSquare(
  model: GroundModel,
  groundLevel: number,
  state: GroundState,
  column: number,
  row: number,
): LevelField | undefined {
  const [west, south] = [column * SURFACE_SQUARE, row * SURFACE_SQUARE];
  const [east, north] = [west + SURFACE_SQUARE, south + SURFACE_SQUARE];
  const ring: PlanPoint[] = [
    [west, south],
    [east, south],
    [east, north],
    [west, north],
  ];
  try {
    const site = siteOf(model, placeOfFootprint([ring], groundLevel, groundLevel));
    const field = levelField(model, site, state);
    const middle: PlanPoint = [(west + east) / 2, (south + north) / 2];
    return { ...field, packs: field.packs.map((pack) => partsInReach(pack, middle)) };
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    return undefined;
  }
}

function partsOf(
  { pieces, rules }: GroundModel,
  ground: number,
  { position, only }: GroundState,
): GroundSurface['parts'] {
  const rule = ruleAt(rules.depth, position);
  return pieces.flat().flatMap((piece) => {
    if (only?.(piece) === false) return [];
    const axis = Math.min(piece.startLevel, piece.endLevel);
    const k = atPosition(piece.troughWidth, position);
    return [{ plan: piece.plan, width: troughWidth(rule, k, { ground, founding: ground, axis }) }];
  });
}

/**
 * Prepares the movement at ground level anywhere beside some drives: pieces that cannot matter are sorted
 * out square by square, as squares are asked about.
 *
 * Units: m, `factors` one per group of volume loss. Valid: squares where nothing reaches give zeros and a
 * width of Infinity. Source: attewell-woodman-1982; the sum is new-oreilly-1991.
 */
export function groundSurface(
  model: GroundModel,
  groundLevel: number,
  state: GroundState,
  factors: readonly number[],
): GroundSurface {
  const squares = new Map<number, { readonly field: LevelField | undefined }>();
  const [one, sum] = [new Float64Array(FIELD_SIZE), new Float64Array(FIELD_SIZE)];
  let last: { key: number; field: LevelField | undefined } = { key: NaN, field: undefined };

  function squareOf([easting, northing]: PlanPoint): LevelField | undefined {
    const column = Math.floor(easting / SURFACE_SQUARE);
    const row = Math.floor(northing / SURFACE_SQUARE);
    const key = column * ROWS + row;
    if (last.key === key) return last.field;
    const made = squares.get(key) ?? {
      field: fieldOfSquare(model, groundLevel, state, column, row),
    };
    squares.set(key, made);
    last = { key, field: made.field };
    return made.field;
  }

  return {
    parts: partsOf(model, groundLevel, state),
    at: (point) => {
      const field = squareOf(point);
      if (field === undefined) return undefined;
      sum.fill(0);
      for (const [group, { pack, count }] of field.packs.entries()) {
        const factor = factors[group] ?? 0;
        if (count === 0 || factor === 0) continue;
        sumPieces(pack, count, point[0], point[1], one);
        for (let n = 0; n < FIELD_SIZE; n++) sum[n] = at(sum, n) + factor * at(one, n);
      }
      return sum;
    },
    widthAt: (point) => squareOf(point)?.smallestWidth,
  };
}
