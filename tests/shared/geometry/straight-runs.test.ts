import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { polygonEdges } from '../../../shared/geometry/polygon-edges.ts';
import { polylineParts, type PolylinePart } from '../../../shared/geometry/polyline-parts.ts';
import { straightRuns } from '../../../shared/geometry/straight-runs.ts';
import { regularRing } from '../../support/drawn-geometry.ts';
import { holds, numbers } from '../../support/property.ts';
import { keepsTo } from '../../support/straightness.ts';

const TOLERANCE = { angle: Math.PI / 36, offset: 0.5 };

function curve(parts: number, turn: number, length = 5): PlanPoint[] {
  let [x, y] = [0, 0];
  const points: PlanPoint[] = [[0, 0]];
  for (let k = 0; k < parts; k++) {
    points.push([(x += length * Math.cos(k * turn)), (y += length * Math.sin(k * turn))]);
  }
  return points;
}

/** First and last index of each run. */
function spans(chain: readonly PolylinePart[], closed = false): (readonly [number, number])[] {
  return straightRuns(chain, closed, TOLERANCE).map((run) => {
    const [first, last] = [run[0], run.at(-1)];
    if (first === undefined || last === undefined) throw new Error('a run has parts');
    return [chain.indexOf(first), chain.indexOf(last)] as const;
  });
}

describe('straightRuns', () => {
  it('of nothing are none', () => {
    expect(straightRuns([], false, TOLERANCE)).toEqual([]);
    expect(straightRuns([], true, TOLERANCE)).toEqual([]);
  });

  it('of a straight chain are one', () => {
    expect(spans(polylineParts(curve(20, 0)))).toEqual([[0, 19]]);
  });

  it('are cut at a corner', () => {
    const chain = polylineParts([[0, 0], [5, 0], [10, 0], [10, 5], [10, 10]]); // prettier-ignore
    expect(spans(chain)).toEqual([
      [0, 1],
      [2, 3],
    ]);
  });

  it('overlap along a curve: of 5 m parts that turn by 2.5 degrees, four are 0.44 m off, five 0.68', () => {
    const runs = spans(polylineParts(curve(7, (2.5 * Math.PI) / 180)));
    expect(runs).toEqual([
      [0, 3],
      [1, 4],
      [2, 5],
      [3, 6],
    ]);
  });

  it('of a closed ring run on across its start', () => {
    const chain = polygonEdges(regularRing(144, 114.6)).flatMap(({ start, end }) =>
      polylineParts([start, end]),
    );
    const runs = spans(chain, true);
    expect(runs).toHaveLength(144);
    expect(new Set(runs.map(([first, last]) => (last - first + 144) % 144))).toEqual(new Set([3]));
  });

  it('of a closed square are its sides, once each', () => {
    const ring: PlanPoint[] = [[5, 0], [10, 0], [10, 10], [0, 10], [0, 0]]; // prettier-ignore
    const chain = polygonEdges(ring).flatMap(({ start, end }) => polylineParts([start, end]));
    expect(spans(chain, true)).toEqual([
      [1, 1],
      [2, 2],
      [3, 3],
      [4, 0],
    ]);
  });

  const chains = fc
    .array(fc.tuple(numbers(2, 10), numbers(-0.15, 0.15)), { minLength: 1, maxLength: 14 })
    .map((steps) => {
      let [x, y, heading] = [0, 0, 0];
      const points: PlanPoint[] = [[0, 0]];
      for (const [length, turn] of steps) {
        heading += turn;
        points.push([(x += length * Math.cos(heading)), (y += length * Math.sin(heading))]);
      }
      return polylineParts(points);
    });

  it('keep to the tolerance, reach every part, and none lies inside another', () => {
    holds(chains, (chain) => {
      const runs = spans(chain);
      const reached = new Set<number>();
      for (const [k, [first, last]] of runs.entries()) {
        expect(keepsTo(chain.slice(first, last + 1), TOLERANCE)).toBe(true);
        for (let part = first; part <= last; part++) reached.add(part);
        const [nextFirst, nextLast] = runs[k + 1] ?? [Infinity, Infinity];
        expect(nextFirst).toBeGreaterThan(first);
        expect(nextLast).toBeGreaterThan(last);
      }
      expect(reached.size).toBe(chain.length);
    });
  });

  it('leave out no straight run that is longer', () => {
    holds(chains, (chain) => {
      const runs = spans(chain);
      const tighter = {
        angle: TOLERANCE.angle * (1 - 1e-5),
        offset: TOLERANCE.offset * (1 - 1e-5),
      };
      for (let first = 0; first < chain.length; first++) {
        for (let last = first; last < chain.length; last++) {
          if (!keepsTo(chain.slice(first, last + 1), tighter)) continue;
          expect(runs.some(([from, to]) => from <= first && to >= last)).toBe(true);
        }
      }
    });
  });

  it('are the same read backwards', () => {
    holds(chains, (chain) => {
      const back = [...chain].reverse().map(({ start, end, length, direction }) => ({
        start: end,
        end: start,
        length,
        direction: [-direction[0], -direction[1]] as const,
      }));
      const last = chain.length - 1;
      const turnedRound = spans(back).map(([from, to]) => [last - to, last - from]);
      expect(turnedRound.reverse()).toEqual(spans(chain));
    });
  });
});
