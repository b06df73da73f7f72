import { crossings } from './crossings.ts';
import type { Stretch } from './curvature-runs.ts';
import type { Profile } from './profile.ts';
import { profileValue } from './profile-value.ts';

/**
 * What of a wall is ignored: where it settles less than a level (0: nothing is ignored), or where it
 * lies outside given stretches.
 *
 * Units: m. Valid: settlement ≥ 0. Source: [common] for 1 mm; mair-taylor-burland-1996 for the
 * stretches within 2.5 trough widths of a drive.
 */
export type CutOff =
  | { readonly kind: 'settlement'; readonly settlement: number }
  | { readonly kind: 'stretches'; readonly stretches: readonly (readonly [number, number])[] };

function endsBySettlement(
  profile: Profile,
  { start, end }: Stretch,
  level: number,
): [number, number] | undefined {
  const startCounts = profileValue(profile, 'settlement', start) >= level;
  const endCounts = profileValue(profile, 'settlement', end) >= level;
  if (startCounts && endCounts) return [start, end];
  const cuts = crossings(profile, 'settlement', level, start, end);
  const first = startCounts ? start : cuts[0];
  const last = endCounts ? end : cuts.at(-1);
  return first === undefined || last === undefined || first >= last ? undefined : [first, last];
}

function endsByStretches(
  { start, end }: Stretch,
  stretches: readonly (readonly [number, number])[],
): [number, number] | undefined {
  let [first, last] = [Infinity, -Infinity];
  for (const [from, to] of stretches) {
    const [a, b] = [Math.max(from, start), Math.min(to, end)];
    if (a >= b) continue;
    first = Math.min(first, a);
    last = Math.max(last, b);
  }
  return first < last ? [first, last] : undefined;
}

/**
 * A stretch without its two ends that the cut-off ignores, undefined where nothing is left. A dip
 * below the cut-off inside it stays in.
 *
 * Units: m. Valid: any profile. Source: as CutOff.
 */
export function trimmed(profile: Profile, stretch: Stretch, cutOff: CutOff): Stretch | undefined {
  const ends =
    cutOff.kind === 'settlement'
      ? endsBySettlement(profile, stretch, cutOff.settlement)
      : endsByStretches(stretch, cutOff.stretches);
  return ends === undefined ? undefined : { mode: stretch.mode, start: ends[0], end: ends[1] };
}
