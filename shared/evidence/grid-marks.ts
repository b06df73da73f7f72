import { planDistance } from '../geometry/plan-distance.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { formatCount } from '../presentation/format-number.ts';
import { steps } from '../numerics/steps.ts';
import type { GroundFrame } from './ground-frame.ts';
import { cornersOf, lineMark, type Mark, type Spot } from './marks.ts';

/** Distances between lines of the grid, and the least that two of them lie apart on paper, in mm. */
const STEPS = [5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, 10_000];
const APART = 38;

/**
 * The distance between the lines of the grid that a sheet of a scale marks.
 *
 * Units: m. Valid: denominator > 0. Source: [own].
 */
export function gridStep(denominator: number): number {
  return STEPS.find((step) => (step * 1000) / denominator >= APART) ?? 10_000;
}

/**
 * Where a line of the grid meets the neat line: the axis that is constant along it and its value.
 *
 * Units: value m, at mm. Valid: `out` points away from the window. Source: [own].
 */
export type GridTick = {
  readonly axis: 'E' | 'N';
  readonly value: number;
  readonly at: Spot;
  readonly out: Spot;
};

const OUTWARDS: readonly Spot[] = [[0, -1], [1, 0], [0, 1], [-1, 0]]; // prettier-ignore

/**
 * Where the lines of the grid meet the neat line of a sheet. A sheet that lies with the grid has eastings
 * at top and bottom and northings at the sides; a turned one has both on every side.
 *
 * Units: m and mm. Valid: any frame. Source: [own].
 */
export function gridTicks(frame: GroundFrame): GridTick[] {
  const step = gridStep(frame.denominator);
  const corners = cornersOf(frame.window);
  return corners.flatMap((from, side) => {
    const to = corners[(side + 1) % corners.length] ?? from;
    const [start, end] = [frame.ground(from), frame.ground(to)];
    const out = OUTWARDS[side] ?? [0, -1];
    return ([0, 1] as const).flatMap((k) =>
      steps(start[k], end[k], step).map((value): GridTick => {
        const share = (value - start[k]) / (end[k] - start[k]);
        const at: Spot = [from[0] + share * (to[0] - from[0]), from[1] + share * (to[1] - from[1])];
        return { axis: k === 0 ? 'E' : 'N', value, at, out };
      }),
    );
  });
}

const [TICK, CROSS, SIZE] = [2.4, 1.5, 7];
/** Words along one side keep so far from each other, from middle to middle, in mm. */
const WORDS_APART = 26;
const LINE = { ink: 'ink', width: 0.25 } as const;
const FINE = { ink: 'rule', width: 0.13 } as const;

function wordsOfTick({ axis, value, at: [x, y], out: [dx, dy] }: GridTick): Mark {
  const isLevel = dx === 0;
  return {
    ...{ kind: 'words', words: `${axis} ${formatCount(value)}`, size: SIZE, anchor: 'middle' },
    // at the sides the words run up the sheet
    at: isLevel ? [x, y + (dy < 0 ? -3 : 5.3)] : [x + (dx < 0 ? -3 : 5), y],
    ...(!isLevel && { along: [0, -1] as const }),
  };
}

/**
 * The ticks of the grid with their values, outside of the neat line. Every line of the grid has its tick; on a
 * turned sheet words that would meet are left out.
 *
 * Units: mm. Valid: any frame. Source: [own].
 */
export function gridTickMarks(frame: GroundFrame): Mark[] {
  const written: GridTick[] = [];
  const isFree = ({ at, out }: GridTick) =>
    written.every((one) => one.out !== out || planDistance(one.at, at) >= WORDS_APART);
  return gridTicks(frame).flatMap((tick): Mark[] => {
    const { at: [x, y], out: [dx, dy] } = tick; // prettier-ignore
    const stroke = lineMark([[x, y], [x + dx * TICK, y + dy * TICK]], LINE); // prettier-ignore
    if (!isFree(tick)) return [stroke];
    written.push(tick);
    return [stroke, wordsOfTick(tick)];
  });
}

function crossMarks(frame: GroundFrame, [e, n]: PlanPoint): Mark[] {
  const [x, y] = frame.place([e, n]);
  const { left, top, right, bottom } = frame.window;
  if (x < left + CROSS || x > right - CROSS || y < top + CROSS || y > bottom - CROSS) return [];
  const [a, b] = [frame.right[0] * CROSS, frame.right[1] * CROSS];
  return [
    lineMark([[x - a, y - b], [x + a, y + b]], FINE), // prettier-ignore
    lineMark([[x + b, y - a], [x - b, y + a]], FINE), // prettier-ignore
  ];
}

/**
 * The crosses of the grid inside of the neat line.
 *
 * Units: mm. Valid: any frame. Source: [own].
 */
export function gridCrosses(frame: GroundFrame): Mark[] {
  const step = gridStep(frame.denominator);
  const { west, south, east, north } = frame.box;
  const [eastings, northings] = [steps(west, east, step), steps(south, north, step)];
  return eastings.flatMap((e) => northings.flatMap((n) => crossMarks(frame, [e, n])));
}
