import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  gridCrosses,
  gridStep,
  gridTickMarks,
  gridTicks,
} from '../../../shared/evidence/grid-marks.ts';
import { groundFrame, type GroundFrame } from '../../../shared/evidence/ground-frame.ts';
import { cornersOf } from '../../../shared/evidence/marks.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { ringMarks, wordMarks } from '../../support/marks.ts';
import { holds, numbers } from '../../support/property.ts';

const WINDOW = { left: 17, top: 17, right: 307, bottom: 276 };
const frames = fc
  .record({
    centre: fc.tuple(numbers(300_000, 700_000), numbers(0, 6_000_000)),
    denominator: fc.constantFrom(50, 200, 500, 1250, 2500, 10_000, 50_000),
    right: fc.oneof(
      fc.constant<PlanPoint>([1, 0]),
      numbers(-Math.PI, Math.PI).map((turn): PlanPoint => [Math.cos(turn), Math.sin(turn)]),
    ),
  })
  .map((about) => groundFrame(WINDOW, about));

/** How many lines of the grid the sides of a window cross, counted anew. */
function crossings(frame: GroundFrame): number {
  const step = gridStep(frame.denominator);
  const corners = cornersOf(frame.window).map(frame.ground);
  return corners.reduce((sum, from, k) => {
    const to = corners[(k + 1) % 4] ?? from;
    const passed = ([0, 1] as const).map((axis) => {
      const [low, high] = [Math.min(from[axis], to[axis]), Math.max(from[axis], to[axis])];
      return high - low < 1e-6 ? 0 : Math.floor(high / step) - Math.ceil(low / step) + 1;
    });
    return sum + (passed[0] ?? 0) + (passed[1] ?? 0);
  }, 0);
}

describe('gridStep', () => {
  it.each([
    [50, 5],
    [200, 10],
    [500, 20],
    [1250, 50],
    [2500, 100],
    [10_000, 500],
    [50_000, 2000],
  ])('at 1 : %s it is %s m', (denominator, step) => {
    expect(gridStep(denominator)).toBe(step);
  });
});

describe('gridTicks', () => {
  it('says the value of the ground that it stands at', () => {
    holds(frames, (frame) => {
      for (const { axis, value, at } of gridTicks(frame)) {
        const [easting, northing] = frame.ground(at);
        expect(Math.abs((axis === 'E' ? easting : northing) - value)).toBeLessThan(0.001);
        expect(Math.abs(value % gridStep(frame.denominator))).toBe(0);
      }
    });
  });

  it('stands on the neat line, at every line of the grid that crosses it', () => {
    holds(frames, (frame) => {
      const ticks = gridTicks(frame);
      const { left, top, right, bottom } = WINDOW;
      for (const {
        at: [x, y],
      } of ticks) {
        // prettier-ignore
        const off = Math.min(...[x - left, x - right, y - top, y - bottom].map(Math.abs));
        expect(off).toBeLessThan(1e-9);
      }
      expect(ticks).toHaveLength(crossings(frame));
    });
  });

  it('has eastings at top and bottom and northings at the sides of a sheet along the grid', () => {
    const ticks = gridTicks(groundFrame(WINDOW, { centre: [500_000, 100], denominator: 500 }));
    expect(ticks.length).toBeGreaterThan(10);
    for (const { axis, out } of ticks) expect(axis).toBe(out[0] === 0 ? 'E' : 'N');
  });
});

describe('the grid of a sheet', () => {
  it('draws every stroke, and keeps words of one side 26 mm apart', () => {
    holds(frames, (frame) => {
      const ticks = gridTickMarks(frame);
      expect(ringMarks(ticks)).toHaveLength(gridTicks(frame).length);
      const words = wordMarks(ticks);
      const { left, top, right, bottom } = WINDOW;
      const sides = [
        words.filter(({ at: [, y] }) => y < top),
        words.filter(({ at: [, y] }) => y > bottom),
        words.filter(({ at: [x] }) => x < left),
        words.filter(({ at: [x] }) => x > right),
      ];
      for (const side of sides) {
        for (const [k, one] of side.entries()) {
          for (const other of side.slice(k + 1))
            expect(planDistance(one.at, other.at)).toBeGreaterThanOrEqual(26);
        }
      }
    });
  });

  it('writes a value at every tick of a sheet along the grid', () => {
    const frame = groundFrame(WINDOW, { centre: [500_000, 60], denominator: 500 });
    const words = wordMarks(gridTickMarks(frame)).map((mark) => mark.words);
    expect(words).toHaveLength(gridTicks(frame).length);
    expect(words.filter((one) => /^E 500\s000$/.test(one))).toHaveLength(2);
    expect(words).toContain('N 100');
    expect(words).toContain('N 0');
  });

  it('crosses where lines of the grid cross', () => {
    holds(frames, (frame) => {
      const crosses = gridCrosses(frame);
      const step = gridStep(frame.denominator);
      for (const [[ax, ay] = [0, 0], [bx, by] = [0, 0]] of ringMarks(crosses)) {
        const [e, n] = frame.ground([(ax + bx) / 2, (ay + by) / 2]);
        expect(Math.abs(e - Math.round(e / step) * step)).toBeLessThan(0.001);
        expect(Math.abs(n - Math.round(n / step) * step)).toBeLessThan(0.001);
      }
    });
  });
});

describe('the crosses of a turned sheet', () => {
  it('have arms along the grid', () => {
    const right: PlanPoint = [Math.cos(0.4), Math.sin(0.4)];
    const frame = groundFrame(WINDOW, { centre: [500_000, 6_000_000], denominator: 1250, right });
    const alongGrid = ringMarks(gridCrosses(frame)).map((arm) => {
      const [from, to] = arm.map((spot) => frame.ground(spot));
      const [e, n] = [(to?.[0] ?? 0) - (from?.[0] ?? 0), (to?.[1] ?? 0) - (from?.[1] ?? 0)];
      return Math.min(Math.abs(e), Math.abs(n));
    });
    expect(alongGrid.length).toBeGreaterThan(10);
    expect(Math.max(...alongGrid)).toBeLessThan(1e-6);
  });
});
