import { erf } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { at } from '../../../shared/numerics/at.ts';
import { normalDensity } from '../../../shared/numerics/normal-density.ts';
import { normalDistribution } from '../../../shared/numerics/normal-distribution.ts';
import {
  NODES_PER_UNIT,
  NORMAL_TABLE,
  NORMAL_TABLE_STRIDE,
  TABLE_REACH,
} from '../../../shared/numerics/normal-table.ts';
import { holds, numbers } from '../../support/property.ts';

/** The terms of the node nearest to x, and the distance of x from it. */
function nearest(x: number): { terms: number[]; d: number } {
  const k = Math.round((x + TABLE_REACH) * NODES_PER_UNIT);
  const terms = Array.from({ length: NORMAL_TABLE_STRIDE }, (_, n) =>
    at(NORMAL_TABLE, k * NORMAL_TABLE_STRIDE + n),
  );
  return { terms, d: x - (k / NODES_PER_UNIT - TABLE_REACH) };
}

describe('NORMAL_TABLE', () => {
  it('has a node for both ends and one to spare', () => {
    const nodes = NORMAL_TABLE.length / NORMAL_TABLE_STRIDE;
    expect(nodes - 1).toBeGreaterThanOrEqual(2 * TABLE_REACH * NODES_PER_UNIT);
  });

  it('holds Φ, φ and the terms of φ, by hand at 0 and 1', () => {
    const phi0 = 0.3989422804014327;
    const phi1 = 0.24197072451914337;
    const wanted0 = [0.5, phi0, 0, -phi0 / 2, 0, phi0 / 8];
    const wanted1 = [0.841344746068543, phi1, -phi1, 0, phi1 / 3, -phi1 / 12];
    for (const [n, wanted] of wanted0.entries()) {
      expect(nearest(0).terms[n]).toBeCloseTo(wanted, 15);
    }
    for (const [n, wanted] of wanted1.entries()) {
      expect(nearest(1).terms[n]).toBeCloseTo(wanted, 14);
    }
  });

  it('ends where nothing is left to 1e-15', () => {
    const [first, last] = [nearest(-TABLE_REACH).terms, nearest(TABLE_REACH).terms];
    for (const term of first) expect(Math.abs(term)).toBeLessThan(1e-13);
    expect(first[0]).toBeLessThan(1e-16);
    expect(last[0]).toBe(1);
  });

  it('gives Φ to 1e-11, against mathjs', () => {
    holds(numbers(-TABLE_REACH, TABLE_REACH), (x) => {
      const { terms, d } = nearest(x);
      const [t0 = NaN, t1 = NaN, t2 = NaN, t3 = NaN, t4 = NaN] = terms;
      const got = t0 + d * (t1 + d * (t2 / 2 + d * (t3 / 3 + (d * t4) / 4)));
      // d⁵/120 of the fourth derivative of φ, which is 1.2 at most: 3.1e-12 for d of 1/80
      expect(Math.abs(got - (1 + erf(x * Math.SQRT1_2)) / 2)).toBeLessThan(1e-11);
    });
  });

  it('gives φ to 1e-11', () => {
    holds(numbers(-TABLE_REACH, TABLE_REACH), (x) => {
      const { terms, d } = nearest(x);
      const [, t1 = NaN, t2 = NaN, t3 = NaN, t4 = NaN, t5 = NaN] = terms;
      const got = t1 + d * (t2 + d * (t3 + d * (t4 + d * t5)));
      // d⁵/120 of the fifth derivative of φ, which is 2.31 at most: 5.9e-12 for d of 1/80
      expect(Math.abs(got - normalDensity(x))).toBeLessThan(1e-11);
    });
  });

  it('does so half-way between every two nodes, where it is worst', () => {
    for (let x = -TABLE_REACH + 1 / 80; x < TABLE_REACH; x += 1 / 40) {
      const { terms, d } = nearest(x);
      const [t0 = NaN, t1 = NaN, t2 = NaN, t3 = NaN, t4 = NaN, t5 = NaN] = terms;
      const density = t1 + d * (t2 + d * (t3 + d * (t4 + d * t5)));
      const distribution = t0 + d * (t1 + d * (t2 / 2 + d * (t3 / 3 + (d * t4) / 4)));
      expect(Math.abs(density - normalDensity(x))).toBeLessThan(1e-11);
      expect(Math.abs(distribution - normalDistribution(x))).toBeLessThan(1e-11);
    }
  });
});
