import { MethodError } from '../method-error.ts';

const MOST_STEPS = 200;

/**
 * The root of f between two arguments at which its signs differ, by false position with the
 * Illinois correction, falling back on bisection whenever that converges slowly.
 *
 * Units: those of the arguments. Valid: f continuous; throws `no-sign-change` when f has the same
 * sign at both ends. Source: dowell-jarratt-1971; the fallback is [own].
 */
export function findRoot(
  f: (x: number) => number,
  from: number,
  to: number,
  tolerance: number,
): number {
  let a = from;
  let b = to;
  let fa = f(a);
  let fb = f(b);
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (fa > 0 === fb > 0) {
    throw new MethodError('no-sign-change', `No root between ${from} and ${to}.`);
  }
  let weightA = 1;
  let weightB = 1;
  for (let step = 0; step < MOST_STEPS && Math.abs(b - a) > tolerance; step++) {
    const width = b - a;
    const secant = a - (width * fa * weightA) / (fb * weightB - fa * weightA);
    const inside = (secant - a) * (secant - b) < 0;
    const x = inside && step % 3 !== 2 ? secant : a + width / 2;
    if (x === a || x === b) break;
    const fx = f(x);
    if (fx === 0) return x;
    if (fx > 0 === fb > 0) {
      b = x;
      fb = fx;
      weightB = 1;
      weightA /= 2;
    } else {
      a = x;
      fa = fx;
      weightA = 1;
      weightB /= 2;
    }
  }
  return Math.abs(fa) < Math.abs(fb) ? a : b;
}
