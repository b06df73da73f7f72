import { boundingBox } from '../geometry/bounding-box.ts';
import { planDistance } from '../geometry/plan-distance.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { MethodError } from '../method-error.ts';
import type { LineOnGround } from './line-on-ground.ts';

/**
 * The piece of ground of one sheet of a series: the chainages that it shows, the point in its middle and
 * the direction that runs to the right of it.
 *
 * Units: m. Valid: made by `stripStretches`. Source: [own].
 */
export type StripStretch = {
  readonly from: number;
  readonly to: number;
  readonly centre: PlanPoint;
  readonly right: PlanPoint;
};

/** Of a window's sides, how much the line may take: the rest shows what stands beyond it. */
const [LONG, TALL] = [0.94, 0.4];
/** A stretch is shortened by so much of the window until the line fits. */
const STEP = 0.02;

type Ground = { readonly wide: number; readonly tall: number };

/** A stretch on a sheet turned to its chord, or undefined where the line leaves the part meant for it. */
function fitted(
  line: LineOnGround,
  from: number,
  to: number,
  { wide, tall }: Ground,
): StripStretch | undefined {
  const [start, end] = [line.pointAt(from), line.pointAt(to)];
  const long = planDistance(start, end);
  // a line that comes back to where it began has no direction
  if (!(long > 0.2 * (to - from))) return undefined;
  const right: PlanPoint = [(end[0] - start[0]) / long, (end[1] - start[1]) / long];
  const turned = line.between(from, to).map(([e, n]): PlanPoint => {
    const [x, y] = [e - start[0], n - start[1]];
    return [x * right[0] + y * right[1], y * right[0] - x * right[1]];
  });
  const { west, south, east, north } = boundingBox(turned);
  if (east - west > LONG * wide || north - south > TALL * tall) return undefined;
  const [along, up] = [(west + east) / 2, (south + north) / 2];
  const centre: PlanPoint = [
    start[0] + along * right[0] - up * right[1],
    start[1] + along * right[1] + up * right[0],
  ];
  return { from, to, centre, right };
}

/** The longest stretch from a chainage on that fits on one sheet. */
function longest(line: LineOnGround, from: number, end: number, ground: Ground): StripStretch {
  for (let share = 1; share > 0; share -= STEP) {
    // a bent line is longer than its sheet is wide
    const to = Math.min(end, from + 2 * share * ground.wide);
    const found = to > from ? fitted(line, from, to, ground) : undefined;
    if (found !== undefined) return found;
  }
  throw new MethodError(
    'outside-range',
    'The line bends too sharply for sheets of this scale.',
    'denominator',
  );
}

/**
 * Lays a line out on sheets that are turned to it: each shows as much of it as fits, from where the sheet
 * before ends less the overlap. It stops at one more than the most sheets that may be.
 *
 * Units: m; `wide` and `tall` are the ground that a sheet's window shows. Valid: throws `outside-range` with
 * the field to change where the overlap leaves nothing of a sheet, or the line bends too sharply.
 * Source: [own].
 */
export function stripStretches(
  line: LineOnGround,
  {
    from,
    to,
    overlap,
    most,
    ...ground
  }: Ground & Readonly<Record<'from' | 'to' | 'overlap' | 'most', number>>,
): StripStretch[] {
  const found: StripStretch[] = [];
  for (let start = from; found.length <= most;) {
    const stretch = longest(line, start, to, ground);
    found.push(stretch);
    if (stretch.to >= to) return found;
    if (stretch.to - overlap <= start) {
      throw new MethodError(
        'outside-range',
        'The overlap leaves nothing of a sheet. Make it shorter.',
        'overlap',
      );
    }
    start = stretch.to - overlap;
  }
  return found;
}
