import type { Recorder } from '../working.ts';
import { crossings } from './crossings.ts';
import type { Profile } from './profile.ts';
import { profileValue } from './profile-value.ts';

/**
 * How a whole wall moves: largest settlement and where, steepest slope, tilt from end to end and
 * angular distortion, which is the largest departure of the slope from the tilt.
 *
 * Units: m and m/m. Valid: length > 0. Source: burland-wroth-1974 for the words; rankin-1988 uses
 * settlement and slope.
 */
export type WallExtremes = {
  readonly settlementMax: number;
  readonly settlementMaxAt: number;
  readonly slopeMax: number;
  readonly tilt: number;
  readonly angularDistortion: number;
};

/**
 * The extremes of a wall that moves as `scale` times a profile.
 *
 * Units: m; scale without unit. Valid: scale ≥ 0. Source: as WallExtremes.
 */
export function wallExtremes(
  profile: Profile,
  scale: number,
  length: number,
  record?: Recorder,
): WallExtremes {
  const settlementAt = (x: number) => scale * profileValue(profile, 'settlement', x);
  const slopeAt = (x: number) => scale * profileValue(profile, 'slope', x);
  const tilt = (settlementAt(length) - settlementAt(0)) / length;
  let [settlementMax, settlementMaxAt] = [-Infinity, 0];
  for (const x of [0, ...crossings(profile, 'slope', 0, 0, length), length]) {
    if (settlementAt(x) > settlementMax) [settlementMax, settlementMaxAt] = [settlementAt(x), x];
  }
  let [slopeMax, angularDistortion, distortedAt] = [0, 0, 0];
  for (const x of [0, ...crossings(profile, 'curvature', 0, 0, length), length]) {
    slopeMax = Math.max(slopeMax, Math.abs(slopeAt(x)));
    const distortion = Math.abs(slopeAt(x) - tilt);
    if (distortion > angularDistortion) [angularDistortion, distortedAt] = [distortion, x];
  }
  if (record) {
    record({
      symbol: 'tilt',
      meaning: 'difference of settlement between the ends of the wall, by its length',
      expression: '(S_end - S_start) / L',
      inputs: { S_end: settlementAt(length), S_start: settlementAt(0), L: length },
      value: tilt,
      unit: 'm/m',
      reference: 'burland-wroth-1974',
    });
    record({
      symbol: 'angular distortion',
      meaning: `largest departure of the slope m from the tilt, at ${distortedAt.toFixed(3)} m`,
      expression: 'abs(m - tilt)',
      inputs: { m: slopeAt(distortedAt), tilt },
      value: angularDistortion,
      unit: 'm/m',
      reference: 'burland-wroth-1974',
    });
  }
  return { settlementMax, settlementMaxAt, slopeMax, tilt, angularDistortion };
}
