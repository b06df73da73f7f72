import { curvatureRuns, FLAT_CURVATURE, type Mode, type Stretch } from './curvature-runs.ts';
import { trimmed, type CutOff } from './cut-off.ts';
import { joinSlivers } from './join-slivers.ts';
import type { Profile } from './profile.ts';
import { profileValue } from './profile-value.ts';

function modeOf(profile: Profile, start: number, end: number): Mode {
  const change = profileValue(profile, 'slope', end) - profileValue(profile, 'slope', start);
  return change > 0 ? 'hogging' : 'sagging';
}

/** A cut-off for the profile before it is multiplied by a scale. */
function unscaled(cutOff: CutOff, scale: number): CutOff {
  if (cutOff.kind === 'stretches') return cutOff;
  return { kind: 'settlement', settlement: cutOff.settlement / scale };
}

/**
 * The zones of a wall that moves as `scale` times a profile: split where the curvature changes sign,
 * freed of what the cut-off ignores, then of slivers. Any number may come out.
 *
 * Units: m; scale without unit. Valid: scale ≥ 0; at 0 there is none. Source:
 * mair-taylor-burland-1996; the treatment of slivers is [common].
 */
export function zonesOfWall(profile: Profile, scale: number, cutOff: CutOff): Stretch[] {
  if (!(scale > 0)) return [];
  const kept = unscaled(cutOff, scale);
  const stretches = curvatureRuns(profile, FLAT_CURVATURE / scale).flatMap((run) => {
    const stretch = trimmed(profile, run, kept);
    return stretch === undefined ? [] : [stretch];
  });
  return joinSlivers(stretches, (start, end) => modeOf(profile, start, end));
}
