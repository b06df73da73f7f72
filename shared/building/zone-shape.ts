import type { Recorder } from '../working.ts';
import type { Stretch } from './curvature-runs.ts';
import { deflection } from './deflection.ts';
import { averageHorizontalStrain, peakHorizontalStrain } from './horizontal-strain.ts';
import type { Profile } from './profile.ts';
import { profileValue } from './profile-value.ts';

/**
 * Which horizontal strain of a zone counts, and whether compression may relieve tension.
 *
 * Units: none. Valid: closed lists; average and counted are the defaults. Source: burland-1995 for
 * the average; the others are [common].
 */
export type StrainRules = {
  readonly horizontalStrain: 'average' | 'peak';
  readonly compression: 'counted' | 'zero';
};

/**
 * A zone with its deflection and the horizontal strain that counts.
 *
 * Units: positions and deflection m, deflection ratio and strain m/m. Valid: finite.
 * Source: burland-wroth-1974, burland-1995.
 */
export type ZoneShape = Stretch & {
  readonly deflection: number;
  readonly deflectionAt: number;
  readonly deflectionRatio: number;
  readonly horizontalStrain: number;
};

function recordDeflection(
  profile: Profile,
  scale: number,
  { start, end }: Stretch,
  found: { deflection: number; at: number },
  record: Recorder,
): void {
  const settlement = (x: number) => scale * profileValue(profile, 'settlement', x);
  const [S_a, S_b, S_x] = [settlement(start), settlement(end), settlement(found.at)];
  const delta = scale * found.deflection;
  record({
    symbol: 'Δ',
    meaning: 'largest distance of the settlement from the chord of the zone from a to b, at x',
    expression: 'abs(S_x - S_a - (S_b - S_a) * (x - a) / (b - a))',
    inputs: { a: start, b: end, x: found.at, S_a, S_b, S_x },
    value: delta,
    unit: 'm',
    reference: 'burland-wroth-1974',
  });
  record({
    symbol: 'DL',
    meaning: 'deflection ratio Δ/L of the zone',
    expression: 'Δ / (b - a)',
    inputs: { Δ: delta, a: start, b: end },
    value: delta / (end - start),
    unit: 'm/m',
    reference: 'burland-wroth-1974',
  });
}

function recordStrains(
  profile: Profile,
  scale: number,
  { start, end }: Stretch,
  record: Recorder,
): void {
  const displacement = (x: number) => scale * profileValue(profile, 'displacement', x);
  record({
    symbol: 'ε_avg',
    meaning: 'average horizontal strain of the zone',
    expression: '(u_b - u_a) / (b - a)',
    inputs: { u_a: displacement(start), u_b: displacement(end), a: start, b: end },
    value: scale * averageHorizontalStrain(profile, start, end),
    unit: 'm/m',
    reference: 'burland-1995',
  });
  const peak = scale * peakHorizontalStrain(profile, start, end);
  record({
    symbol: 'ε_peak',
    meaning: 'most tensile horizontal strain in the zone',
    expression: 'ε_max',
    inputs: { ε_max: peak },
    value: peak,
    unit: 'm/m',
    reference: 'common-practice',
  });
}

/**
 * The shape of one zone of a wall that moves as `scale` times a profile.
 *
 * Units: m; scale without unit. Valid: a stretch of `zonesOfWall` at the same scale.
 * Source: burland-wroth-1974, burland-1995.
 */
export function zoneShape(
  profile: Profile,
  scale: number,
  stretch: Stretch,
  rules: StrainRules,
  record?: Recorder,
): ZoneShape {
  const { start, end, mode } = stretch;
  const unit = deflection(profile, start, end);
  const delta = scale * unit.deflection;
  const deflectionRatio = delta / (end - start);
  const strainOf =
    rules.horizontalStrain === 'average' ? averageHorizontalStrain : peakHorizontalStrain;
  const chosen = scale * strainOf(profile, start, end);
  const horizontalStrain = rules.compression === 'zero' ? Math.max(0, chosen) : chosen;
  if (record) {
    recordDeflection(profile, scale, stretch, unit, record);
    recordStrains(profile, scale, stretch, record);
    record({
      symbol: 'ε_h',
      meaning: `horizontal strain that counts: ${rules.horizontalStrain}, compression ${rules.compression}`,
      expression: rules.compression === 'zero' ? 'max(0, ε_c)' : 'ε_c',
      inputs: { ε_c: chosen },
      value: horizontalStrain,
      unit: 'm/m',
      reference: rules.horizontalStrain === 'average' ? 'burland-1995' : 'common-practice',
    });
  }
  return {
    mode,
    start,
    end,
    deflection: delta,
    deflectionAt: unit.at,
    deflectionRatio,
    horizontalStrain,
  };
}
