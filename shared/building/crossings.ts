import { at } from '../numerics/at.ts';
import { monotoneRoot } from '../numerics/monotone-root.ts';
import { evaluatePolynomial } from '../numerics/evaluate-polynomial.ts';
import { polynomialIsMonotone } from '../numerics/polynomial-is-monotone.ts';
import { polynomialRoots } from '../numerics/polynomial-roots.ts';
import { polynomialSide } from '../numerics/polynomial-side.ts';
import { PROFILE, PROFILE_STRIDE, type Profile, type ProfileQuantity } from './profile.ts';
import { intervalOf, shareOf } from './profile-value.ts';

function crossingsInInterval(
  profile: Profile,
  quantity: ProfileQuantity,
  level: number,
  interval: number,
  from: number,
  to: number,
): number[] {
  const { offset, degree } = PROFILE[quantity];
  const c = profile.coefficients;
  const start = interval * PROFILE_STRIDE + offset;
  if (polynomialSide(c, start, degree, level) !== 0) return [];
  if (polynomialIsMonotone(c, start, degree)) {
    const [a, b] = [
      evaluatePolynomial(c, start, degree, from) - level,
      evaluatePolynomial(c, start, degree, to) - level,
    ];
    if (a === 0) return [from];
    if (b === 0) return [to];
    return a > 0 === b > 0 ? [] : [monotoneRoot(c, start, degree, level, from, to)];
  }
  const own = c.slice(start, start + degree + 1);
  own[0] = at(own, 0) - level;
  return polynomialRoots(own, degree, from, to);
}

/**
 * All distances along a wall, in order, at which a quantity of its profile passes a level.
 *
 * Units: level as PROFILE, distances m. Valid: 0 ≤ from ≤ to ≤ the wall's length; none is missed,
 * since bounds of the polynomials decide and not samples. Source: [own].
 */
export function crossings(
  profile: Profile,
  quantity: ProfileQuantity,
  level: number,
  from: number,
  to: number,
): number[] {
  const { offset, degree } = PROFILE[quantity];
  const found: number[] = [];
  let before = 0;
  const last = intervalOf(profile, to);
  for (let interval = intervalOf(profile, from); interval <= last; interval++) {
    const start = at(profile.nodes, interval);
    const width = at(profile.nodes, interval + 1) - start;
    const a = Math.max(0, shareOf(profile, interval, from));
    const b = Math.min(1, shareOf(profile, interval, to));
    if (!(a < b)) continue;
    const base = interval * PROFILE_STRIDE + offset;
    // Two polynomials agree at their node only to rounding: a level between the two values is passed there.
    const here = evaluatePolynomial(profile.coefficients, base, degree, a) - level;
    if (before * here < 0 && start !== found.at(-1)) found.push(start);
    before = evaluatePolynomial(profile.coefficients, base, degree, b) - level;
    for (const t of crossingsInInterval(profile, quantity, level, interval, a, b)) {
      const x = start + t * width;
      if (x !== found.at(-1)) found.push(x);
    }
  }
  return found;
}
