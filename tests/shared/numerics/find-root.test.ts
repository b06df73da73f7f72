import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { MethodError } from '../../../shared/method-error.ts';
import { findRoot } from '../../../shared/numerics/find-root.ts';
import { holds, numbers } from '../../support/property.ts';

function counted(f: (x: number) => number): { f: (x: number) => number; calls: () => number } {
  let calls = 0;
  function counting(x: number): number {
    calls++;
    return f(x);
  }
  return { f: counting, calls: () => calls };
}

describe('findRoot', () => {
  it('finds the root of two', () => {
    expect(findRoot((x) => x * x - 2, 0, 2, 1e-13)).toBeCloseTo(Math.SQRT2, 12);
  });

  it('finds the root from either side', () => {
    expect(findRoot((x) => x * x - 2, 2, 0, 1e-13)).toBeCloseTo(Math.SQRT2, 12);
    expect(findRoot((x) => 2 - x * x, 0, 2, 1e-13)).toBeCloseTo(Math.SQRT2, 12);
  });

  it('finds where a cosine meets its argument', () => {
    expect(findRoot((x) => Math.cos(x) - x, 0, 1, 1e-13)).toBeCloseTo(0.7390851332151607, 12);
  });

  it('returns an end that is a root', () => {
    expect(findRoot((x) => x, 0, 1, 1e-9)).toBe(0);
    expect(findRoot((x) => x - 1, 0, 1, 1e-9)).toBe(1);
  });

  it('needs few steps for a smooth function: Illinois, not bisection', () => {
    const { f, calls } = counted((x) => x * x - 2);
    findRoot(f, 0, 2, 1e-13);
    // bisection from 2 to 1e-13 would take 45
    expect(calls()).toBeLessThan(12);
  });

  it('finds a straight line at once', () => {
    const { f, calls } = counted((x) => x - 0.3);
    expect(findRoot(f, 0, 1, 1e-13)).toBeCloseTo(0.3, 15);
    expect(calls()).toBeLessThanOrEqual(4);
  });

  it('still converges where false position stalls', () => {
    expect(Math.abs(findRoot((x) => x ** 9, -1, 1.5, 1e-13))).toBeLessThan(1e-13);
    expect(findRoot((x) => Math.exp(x) - 5, -50, 50, 1e-12)).toBeCloseTo(Math.log(5), 11);
  });

  it('finds a jump', () => {
    expect(findRoot((x) => (x < 0.3 ? -1 : 1), 0, 1, 1e-12)).toBeCloseTo(0.3, 11);
  });

  it('finds any root of a cubic to the tolerance', () => {
    const cases = fc.tuple(numbers(-10, 10), numbers(0.1, 5), numbers(0.1, 20), numbers(0.1, 20));
    holds(cases, ([root, scale, before, after]) => {
      function f(x: number): number {
        return scale * (x - root) * ((x - root) * (x - root) + 1);
      }
      expect(Math.abs(findRoot(f, root - before, root + after, 1e-11) - root)).toBeLessThan(1e-10);
    });
  });

  it('stays inside its bracket', () => {
    holds(fc.tuple(numbers(-3, -0.01), numbers(0.01, 3)), ([from, to]) => {
      const { f, calls } = counted((x) => {
        expect(x).toBeGreaterThanOrEqual(from);
        expect(x).toBeLessThanOrEqual(to);
        return Math.atan(20 * x) + 0.001 * x;
      });
      findRoot(f, from, to, 1e-12);
      // two in three steps at worst halve nothing: 3 · log2(6 / 1e-12)
      expect(calls()).toBeLessThan(135);
    });
  });

  it('refuses a function of one sign, by name', () => {
    try {
      findRoot((x) => x * x + 1, -1, 1, 1e-9);
      expect.unreachable();
    } catch (error) {
      expect(error).toBeInstanceOf(MethodError);
      expect(error).toMatchObject({ code: 'no-sign-change' });
    }
  });
});
