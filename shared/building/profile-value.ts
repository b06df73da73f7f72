import { at } from '../numerics/at.ts';
import { evaluatePolynomial } from '../numerics/evaluate-polynomial.ts';
import { intervalIndex } from '../numerics/interval-index.ts';
import { PROFILE, PROFILE_STRIDE, type Profile, type ProfileQuantity } from './profile.ts';

/**
 * The interval of a profile that holds a distance along the wall.
 *
 * Units: x in m. Valid: x beyond the ends gives the first or last interval. Source: [own].
 */
export function intervalOf(profile: Profile, x: number): number {
  return intervalIndex(profile.nodes, x);
}

/**
 * The share of the way through an interval at which a distance along the wall lies.
 *
 * Units: x in m, share without unit. Valid: any x. Source: [own].
 */
export function shareOf(profile: Profile, interval: number, x: number): number {
  const start = at(profile.nodes, interval);
  return (x - start) / (at(profile.nodes, interval + 1) - start);
}

/**
 * A quantity of a profile at a distance along the wall.
 *
 * Units: as PROFILE. Valid: 0 ≤ x ≤ the wall's length. Source: [own].
 */
export function profileValue(profile: Profile, quantity: ProfileQuantity, x: number): number {
  const interval = intervalOf(profile, x);
  const { offset, degree } = PROFILE[quantity];
  return evaluatePolynomial(
    profile.coefficients,
    interval * PROFILE_STRIDE + offset,
    degree,
    shareOf(profile, interval, x),
  );
}
