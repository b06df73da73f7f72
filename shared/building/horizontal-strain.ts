import { at } from '../numerics/at.ts';
import type { Profile } from './profile.ts';
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

/** Where a parabola of strain may be largest: its ends and, inside, its vertex. */
function candidates(profile: Profile, start: number, end: number): number[] {
  const found = [start, end];
  for (let k = intervalOf(profile, start); k <= intervalOf(profile, end); k++) {
    const [a, b] = [at(profile.nodes, k), at(profile.nodes, k + 1)];
    if (a > start && a < end) found.push(a);
    const [from, middle, to] = [a, (a + b) / 2, b].map((x) => profileValue(profile, 'strain', x));
    if (from === undefined || middle === undefined || to === undefined) continue;
    const bend = from - 2 * middle + to;
    if (bend >= 0) continue;
    const vertex = (a + b) / 2 - ((to - from) / bend) * ((b - a) / 4);
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
