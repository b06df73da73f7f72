import { combineProfiles, type Profile } from '../building/profile.ts';
import type { WallField } from './wall-field.ts';

/**
 * A profile and what it is to be multiplied by.
 *
 * Units: none. Valid: scale ≥ 0. Source: [own].
 */
export type LoadedProfile = { readonly profile: Profile; readonly scale: number };

/**
 * The movement along a wall for given factors on the unit volume losses. With one group nothing is
 * added up: the unit profile serves for every volume loss.
 *
 * Units: none. Valid: one factor per group. Source: [own].
 */
export function loadedProfile(field: WallField, factors: readonly number[]): LoadedProfile {
  const [only] = field.profiles;
  if (only !== undefined && field.profiles.length === 1) {
    return { profile: only, scale: factors[0] ?? 0 };
  }
  return { profile: combineProfiles(field.profiles, factors), scale: 1 };
}
