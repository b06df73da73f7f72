import type { CutOff } from '../building/cut-off.ts';
import { combineProfiles, type Profile } from '../building/profile.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { levelField, type GroundState } from '../ground/level-field.ts';
import type { Piece } from '../ground/piece.ts';
import { lagrangeWeights } from '../numerics/lagrange-weights.ts';
import { CENTRAL } from '../numerics/range.ts';
import type { Recorder } from '../working.ts';
import type { DrawnGround, DrawnInputs } from './drawn-inputs.ts';
import type { FieldsOverGrounds, FieldsOverHalf } from './fields-over-grounds.ts';
import type { LoadedProfile } from './loaded-profile.ts';
import type { CutOffRule } from './rules.ts';
import { isOfGround } from './sampled-grounds.ts';
import { cutOffOfWall } from './wall-field.ts';

function halfAt(
  halves: readonly FieldsOverHalf[],
  troughWidth: number,
): FieldsOverHalf | undefined {
  return halves.find(({ widths }) => troughWidth <= (widths.at(-1) ?? 0));
}

function weightsAt({ widths }: FieldsOverHalf, troughWidth: number): number[] {
  return lagrangeWeights(
    widths.map((width) => 1 / width),
    1 / troughWidth,
  );
}

/**
 * The working of a sample's interpolation in one ground: what the unit field at each K is multiplied by.
 *
 * Units: none. Valid: as `sampledProfile`. Source: [own], Lagrange interpolation in 1/K.
 */
export function recordInterpolation(
  { ground, halves }: FieldsOverGrounds['grounds'][number],
  { factor, troughWidth }: DrawnGround,
  record: Recorder,
): void {
  const half = halfAt(halves, troughWidth);
  if (half === undefined) return;
  const { widths } = half;
  const k = 1 / troughWidth;
  if (widths.length > 1)
    record({
      symbol: 'k',
      meaning: `1/K of ground ${ground.number}, over which the unit fields are interpolated`,
      expression: '1 / K',
      inputs: { K: troughWidth },
      value: k,
      unit: '',
      reference: 'own',
    });
  const places = Object.fromEntries(widths.map((width, index) => [`k_${index + 1}`, 1 / width]));
  for (const [index, weight] of weightsAt(half, troughWidth).entries()) {
    const own = `k_${index + 1}`;
    const others = Object.keys(places).filter((name) => name !== own);
    const over = others.map((name) => `(k - ${name})`).join(' * ');
    const under = others.map((name) => `(${own} - ${name})`).join(' * ');
    record({
      symbol: `w_${index + 1}`,
      meaning: `factor on the unit field of ground ${ground.number} at K ${(widths[index] ?? 0).toFixed(4)}`,
      expression: others.length === 0 ? 'r' : `r * ${over} / (${under})`,
      inputs: others.length === 0 ? { r: factor } : { r: factor, k, ...places },
      value: factor * weight,
      unit: '',
      reference: 'own',
    });
  }
}

/**
 * The movement along a wall that a sample gives.
 *
 * Units: m. Valid: `fields` and `drawn` of the same grounds. Source: new-oreilly-1991, for adding the
 * movements of several drives.
 */
export function sampledProfile(
  { grounds }: FieldsOverGrounds,
  { grounds: drawn }: DrawnInputs,
): LoadedProfile | null {
  const profiles: Profile[] = [];
  const factors: number[] = [];
  for (const [index, { halves }] of grounds.entries()) {
    const { factor, troughWidth } = drawn[index] ?? { factor: 0, troughWidth: 0 };
    const half = halfAt(halves, troughWidth);
    if (half === undefined) continue;
    profiles.push(...half.profiles);
    factors.push(...weightsAt(half, troughWidth).map((weight) => factor * weight));
  }
  if (profiles.length === 0) return null;
  return { profile: combineProfiles(profiles, factors), scale: 1 };
}

/**
 * What of a wall a sample ignores; where the rule goes by trough widths they are those of its K.
 *
 * Units: m. Valid: as `sampledProfile`. Source: as CutOff.
 */
export function sampledCutOff(
  model: GroundModel,
  { wall, site, grounds }: FieldsOverGrounds,
  { grounds: drawn }: DrawnInputs,
  rule: CutOffRule,
  faces: GroundState['faces'],
): CutOff {
  if (rule.kind === 'settlement') return rule;
  const fields = grounds.flatMap(({ ground, halves }, index) => {
    if (halves.length === 0) return [];
    const only = (piece: Piece) => isOfGround(model, ground, piece);
    return [levelField(model, site, { position: drawn[index]?.position ?? CENTRAL, faces, only })];
  });
  return cutOffOfWall(rule, wall, fields);
}
