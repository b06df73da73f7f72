import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chainages } from '../../../shared/geometry/chainages.ts';
import { chordArc, type Arc } from '../../../shared/geometry/chord-arc.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { PlanPoint, SpacePoint } from '../../../shared/geometry/point.ts';
import { at } from '../../../shared/numerics/at.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { FAR_FROM_ORIGIN, motions, movePoint, moveSpacePoint } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

type Drawn = { radius: number; from: number; sweep: number; direction: Arc['direction'] };

const drawn = fc.record({
  radius: numbers(10, 1000),
  from: numbers(-Math.PI, Math.PI),
  sweep: numbers(0.01, 6.27),
  direction: fc.constantFrom('left' as const, 'right' as const),
});
const tolerances = fc.constantFrom(0.001, 0.01, 0.1);

function arcOf({ radius, from, sweep, direction }: Drawn): Arc {
  const to = direction === 'left' ? from + sweep : from - sweep;
  return {
    start: [radius * Math.cos(from), radius * Math.sin(from), -30],
    end: [radius * Math.cos(to), radius * Math.sin(to), -10],
    centre: [0, 0],
    direction,
  };
}

function plan([x, y]: SpacePoint): PlanPoint {
  return [x, y];
}

const quarter: Arc = { start: [100, 0, 0], end: [0, 100, 8], centre: [0, 0], direction: 'left' };

describe('chordArc', () => {
  it('of a quarter, by hand: one chord has a sagitta of 29.29 m, two have 7.61 m, four 1.92 m', () => {
    expect(chordArc(quarter, 29.3)).toHaveLength(2);
    expect(chordArc(quarter, 29.2)).toHaveLength(3);
    expect(chordArc(quarter, 7.6)).toHaveLength(5);
    expect(chordArc(quarter, 1.9)).toHaveLength(9);
  });

  it('has its middle at 45 degrees, half-way up', () => {
    const [, middle] = chordArc(quarter, 10);
    expect(middle?.[0]).toBeCloseTo(100 * Math.SQRT1_2, 12);
    expect(middle?.[1]).toBeCloseTo(100 * Math.SQRT1_2, 12);
    expect(middle?.[2]).toBe(4);
  });

  it('goes the other way round for three quarters', () => {
    const [, middle] = chordArc({ ...quarter, direction: 'right' }, 100);
    expect(middle?.[0]).toBeCloseTo(-100 * Math.SQRT1_2, 12);
    expect(middle?.[1]).toBeCloseTo(-100 * Math.SQRT1_2, 12);
  });

  it('of half a circle passes on the side that it turns to', () => {
    const half: Arc = { start: [0, 0, 0], end: [20, 0, 0], centre: [10, 0], direction: 'left' };
    const [, below] = chordArc(half, 5);
    const [, above] = chordArc({ ...half, direction: 'right' }, 5);
    expect(below).toEqual([10, -10, 0]);
    expect(above).toEqual([10, 10, 0]);
  });

  it('keeps its ends to the last bit', () => {
    const odd: Arc = { ...quarter, start: [100.01, 0, 1 / 3] };
    const points = chordArc(odd, 0.001);
    expect(points[0]).toBe(odd.start);
    expect(points.at(-1)).toBe(odd.end);
  });

  it('spreads a small difference of radii evenly', () => {
    const [, middle] = chordArc({ ...quarter, end: [0, 100.04, 0] }, 10);
    expect(planDistance(plan(middle ?? [0, 0, 0]), [0, 0])).toBeCloseTo(100.02, 12);
  });

  it.each([
    ['both ends in one place', { end: [100, 0, 5] }, 'zero-length', undefined],
    ['an end at the centre', { centre: [100, 0] }, 'zero-length', undefined],
    ['a centre that is not one', { centre: [1, 0] }, 'outside-range', 'centre'],
  ] as [string, Partial<Arc>, string, string | undefined][])(
    'refuses %s',
    (_, change, code, field) => {
      expect(methodErrorOf(() => chordArc({ ...quarter, ...change }, 0.01))).toEqual({
        code,
        field,
      });
    },
  );

  it.each([0, -1, NaN, 1e-12])('refuses a tolerance of %d', (tolerance) => {
    expect(methodErrorOf(() => chordArc(quarter, tolerance))).toEqual({
      code: 'outside-range',
      field: 'tolerance',
    });
  });

  it('stays on the circle, and no chord leaves it by more than the tolerance', () => {
    holds(fc.tuple(drawn, tolerances), ([shape, tolerance]) => {
      const points = chordArc(arcOf(shape), tolerance);
      const off = points.map((point) => planDistance(plan(point), [0, 0]) - shape.radius);
      const sagittas = points.slice(1).map(([x, y], k) => {
        const [fromX, fromY] = points[k] ?? [NaN, NaN];
        return shape.radius - planDistance([(fromX + x) / 2, (fromY + y) / 2], [0, 0]);
      });
      // ten roundings of a radius of 1000 m
      expect(Math.max(...off.map(Math.abs))).toBeLessThan(1e-12 * shape.radius + 1e-12);
      expect(Math.max(...sagittas)).toBeLessThan(tolerance * (1 + 1e-9));
    });
  });

  it('has no more than twice the chords it needs', () => {
    holds(fc.tuple(drawn, tolerances), ([shape, tolerance]) => {
      const chords = chordArc(arcOf(shape), tolerance).length - 1;
      const needed = shape.sweep / (2 * Math.acos(1 - tolerance / shape.radius));
      expect(chords).toBeLessThanOrEqual(Math.max(1, 2 * needed * (1 + 1e-6)));
    });
  });

  it('turns one way only, all round, by the whole sweep', () => {
    holds(drawn, (shape) => {
      const points = chordArc(arcOf(shape), 0.01);
      const sign = shape.direction === 'left' ? 1 : -1;
      const steps = points.slice(1).map(([x, y], k) => {
        const [fromX, fromY] = points[k] ?? [NaN, NaN];
        return sign * Math.atan2(fromX * y - fromY * x, fromX * x + fromY * y);
      });
      expect(Math.min(...steps)).toBeGreaterThan(0);
      expect(steps.reduce((sum, step) => sum + step, 0)).toBeCloseTo(shape.sweep, 9);
    });
  });

  it('has equal chords, its level changing evenly along them', () => {
    holds(drawn, (shape) => {
      const points = chordArc(arcOf(shape), 0.05);
      const along = chainages(points);
      const whole = at(along, points.length - 1);
      const shares = points.map((_, k) => k / (points.length - 1));
      const off = shares.map((share, k) => Math.abs(at(along, k) / whole - share));
      const rise = shares.map((share, k) => Math.abs((points[k]?.[2] ?? NaN) + 30 - 20 * share));
      expect(Math.max(...off)).toBeLessThan(1e-9);
      expect(Math.max(...rise)).toBeLessThan(1e-11);
    });
  });

  it('is the same read backwards, turning the other way', () => {
    holds(drawn, (shape) => {
      const arc = arcOf(shape);
      const opposite = arc.direction === 'left' ? 'right' : 'left';
      const back = { ...arc, start: arc.end, end: arc.start, direction: opposite } as const;
      const there = chordArc(arc, 0.05);
      const off = chordArc(back, 0.05)
        .reverse()
        .flatMap((point, k) => point.map((value, axis) => value - (there[k]?.[axis] ?? NaN)));
      // middles of sweeps near a whole circle lean on differences, over 0.01 of the radius
      expect(Math.max(...off.map(Math.abs))).toBeLessThan(1e-10);
    });
  });

  it('moves with its centre and ends', () => {
    holds(fc.tuple(drawn, motions), ([shape, motion]) => {
      const arc = arcOf(shape);
      const moved = {
        start: moveSpacePoint(motion, arc.start),
        end: moveSpacePoint(motion, arc.end),
        centre: movePoint(motion, arc.centre),
        direction: arc.direction,
      };
      // a tolerance that no number of halvings meets exactly
      const there = chordArc(moved, 0.0503);
      const here = chordArc(arc, 0.0503);
      expect(there).toHaveLength(here.length);
      for (const [k, point] of here.entries()) {
        const wanted = movePoint(motion, plan(point));
        const off = planDistance(plan(there[k] ?? [NaN, NaN, NaN]), wanted);
        // middles of sweeps near half or a whole circle lean on differences, over 0.01 of the radius
        expect(off).toBeLessThan(200 * FAR_FROM_ORIGIN);
      }
    });
  });
});
