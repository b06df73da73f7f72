import { at } from '../numerics/at.ts';
import { PROFILE, PROFILE_STRIDE, type Profile } from './profile.ts';
import { intervalOf, profileValue } from './profile-value.ts';

/**
 * The average horizontal strain of a zone, (u(b) − u(a))/L, positive in tension.
 *
 * Units: m/m. Valid: start < end. Source: burland-1995.
 */
export function averageHorizontalStrain(profile: Profile, start: number, end: number): number {
  const u = (x: number) => profileValue(profile, 'displacement', x);
  return (u(end) - u(start)) / (end - start);
}

/** Where the strain may be largest: the ends, the nodes between them and the vertices of its parabolas. */
function candidates(profile: Profile, start: number, end: number): number[] {
  const { nodes, coefficients } = profile;
  const found = [start, end];
  const last = intervalOf(profile, end);
  for (let k = intervalOf(profile, start); k <= last; k++) {
    const [a, b] = [at(nodes, k), at(nodes, k + 1)];
    if (a > start && a < end) found.push(a);
    const base = k * PROFILE_STRIDE + PROFILE.strain.offset;
    const bend = at(coefficients, base + 2);
    if (bend >= 0) continue;
    const vertex = a - (at(coefficients, base + 1) / (2 * bend)) * (b - a);
    if (vertex > Math.max(a, start) && vertex < Math.min(b, end)) found.push(vertex);
  }
  return found;
}

/**
 * The most tensile horizontal strain in a zone.
 *
 * Units: m/m. Valid: start < end. Source: [common].
 */
export function peakHorizontalStrain(profile: Profile, start: number, end: number): number {
  return Math.max(
    ...candidates(profile, start, end).map((x) => profileValue(profile, 'strain', x)),
  );
}
