import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Spot } from '../../../shared/evidence/marks.ts';
import { stretchesIn } from '../../../shared/evidence/stretches-in.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import { beyond } from '../../support/marks.ts';
import { planPoints } from '../../support/drawn-geometry.ts';
import { holds } from '../../support/property.ts';

const WINDOW = { left: -40, top: -30, right: 50, bottom: 60 };
const lines = fc.array(planPoints, { minLength: 2, maxLength: 8 });

function lengthOf(line: readonly Spot[]): number {
  return line.slice(1).reduce((sum, end, k) => sum + planDistance(line[k] ?? end, end), 0);
}

/** The length of a line inside of the window, by stepping along it. */
function lengthInside(line: readonly Spot[]): number {
  const count = 4000;
  return line.slice(1).reduce((sum, end, k) => {
    const [x, y] = line[k] ?? end;
    const inside = Array.from({ length: count }, (_, j): Spot => {
      const share = (j + 0.5) / count;
      return [x + share * (end[0] - x), y + share * (end[1] - y)];
    }).filter((spot) => beyond(WINDOW, spot) === 0).length;
    return sum + (inside / count) * planDistance([x, y], end);
  }, 0);
}

describe('stretchesIn', () => {
  it('keeps inside of the window', () => {
    holds(lines, (line) => {
      for (const spot of stretchesIn(WINDOW, line).flat())
        expect(beyond(WINDOW, spot)).toBeLessThan(1e-9);
    });
  });

  it('has all of the line that is inside', () => {
    holds(
      lines,
      (line) => {
        const long = stretchesIn(WINDOW, line).reduce((sum, one) => sum + lengthOf(one), 0);
        expect(Math.abs(long - lengthInside(line))).toBeLessThan(1);
      },
      50,
    );
  });

  it('leaves a line that is all inside in one piece', () => {
    const line: Spot[] = [[-40, -30], [0, 0], [10, 40], [50, 60]]; // prettier-ignore
    expect(stretchesIn(WINDOW, line)).toEqual([line]);
  });

  it('cuts a line that goes out and comes back in two', () => {
    const line: Spot[] = [[0, 0], [100, 0], [100, 20], [0, 20]]; // prettier-ignore
    expect(stretchesIn(WINDOW, line)).toEqual([
      [[0, 0], [50, 0]],
      [[50, 20], [0, 20]],
    ]); // prettier-ignore
  });

  it('has none of a line that keeps outside', () => {
    expect(stretchesIn(WINDOW, [[60, -30], [60, 60]])).toEqual([]); // prettier-ignore
  });
});
