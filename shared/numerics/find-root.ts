import { MethodError } from '../method-error.ts';

const MOST_STEPS = 200;
/** A bracket that takes more steps than these to halve is halved by bisection. */
const STEPS_TO_HALVE = 3;

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
  let [weightA, weightB] = [1, 1];
  let moved: 'a' | 'b' | undefined;
  let widthAtCheck = Infinity;
  for (let step = 0; step < MOST_STEPS && Math.abs(b - a) > tolerance; step++) {
    const width = b - a;
    const check = step % STEPS_TO_HALVE === STEPS_TO_HALVE - 1;
    const slow = check && Math.abs(width) > widthAtCheck / 2;
    if (check) widthAtCheck = slow ? Math.abs(width) / 2 : Math.abs(width);
    const secant = a - (width * fa * weightA) / (fb * weightB - fa * weightA);
    const inside = (secant - a) * (secant - b) < 0;
    const x = inside && !slow ? secant : a + width / 2;
    if (x === a || x === b) break;
    const fx = f(x);
    if (fx === 0) return x;
    if (fx > 0 === fb > 0) {
      [b, fb, weightB] = [x, fx, 1];
      weightA = moved === 'b' ? weightA / 2 : 1;
      moved = 'b';
    } else {
      [a, fa, weightA] = [x, fx, 1];
      weightB = moved === 'a' ? weightB / 2 : 1;
      moved = 'a';
    }
  }
  return Math.abs(fa) < Math.abs(fb) ? a : b;
}
