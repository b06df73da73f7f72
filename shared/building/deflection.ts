import { crossings } from './crossings.ts';
import type { Profile } from './profile.ts';
import { profileValue } from './profile-value.ts';

/**
 * Δ, the largest distance of the settlement from the chord between the ends of a zone, and where it
 * is. The chord is the zone's, not the wall's.
 *
 * Units: m. Valid: start < end. Source: burland-wroth-1974.
 */
export function deflection(
  profile: Profile,
  start: number,
  end: number,
): { deflection: number; at: number } {
  const atStart = profileValue(profile, 'settlement', start);
  const chord = (profileValue(profile, 'settlement', end) - atStart) / (end - start);
  let largest = { deflection: 0, at: start };
  for (const x of crossings(profile, 'slope', chord, start, end)) {
    const distance = Math.abs(
      profileValue(profile, 'settlement', x) - atStart - chord * (x - start),
    );
    if (distance > largest.deflection) largest = { deflection: distance, at: x };
  }
  return largest;
}
