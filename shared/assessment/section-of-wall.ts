import { profileValue } from '../building/profile-value.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import { CENTRAL } from '../numerics/range.ts';
import { LOSS_LEVELS, type FieldsOverTroughWidth } from './bracket.ts';
import { loadedProfile, type LoadedProfile } from './loaded-profile.ts';

/**
 * How a place on a wall moves: at the central values, and the least and largest settlement over the
 * bracket.
 *
 * Units: x m from the wall's start; settlements and displacement m. Valid: settlementLow ≤ settlement
 * ≤ settlementHigh. Source: [own].
 */
export type SectionPoint = {
  readonly x: number;
  readonly settlement: number;
  readonly displacement: number;
  readonly settlementLow: number;
  readonly settlementHigh: number;
};

/**
 * A wall's movement along its length, for drawing.
 *
 * Units: m. Valid: points in order of x, from 0 to length. Source: [own].
 */
export type WallSection = { readonly length: number; readonly points: readonly SectionPoint[] };

const INTERVALS = 96;

function valueAt(
  { profile, scale }: LoadedProfile,
  what: 'settlement' | 'displacement',
  x: number,
) {
  return scale * profileValue(profile, what, x);
}

/**
 * The movement along a wall at even distances and at the places that must be met exactly, such as the
 * ends of zones.
 *
 * Units: m. Valid: `fields` belong to the wall; places outside of it are left out.
 * Source: attewell-woodman-1982.
 */
export function sectionOfWall(
  model: GroundModel,
  fields: FieldsOverTroughWidth,
  places: readonly number[] = [],
): WallSection {
  const central = fields[CENTRAL];
  if (central === undefined) return { length: 0, points: [] };
  const { length } = central;
  const loaded = loadedProfile(central, lossFactorsAt(model, 'central'));
  const bracket = LOSS_LEVELS.flatMap((level) => {
    const factors = lossFactorsAt(model, level);
    return [...new Set(fields)].map((field) => loadedProfile(field, factors));
  });
  const even = Array.from({ length: INTERVALS + 1 }, (_, k) => (k * length) / INTERVALS);
  const inside = places.filter((x) => x >= 0 && x <= length);
  const points = [...new Set([...even, ...inside])]
    .sort((a, b) => a - b)
    .map((x) => {
      const settlements = bracket.map((one) => valueAt(one, 'settlement', x));
      return {
        x,
        settlement: valueAt(loaded, 'settlement', x),
        displacement: valueAt(loaded, 'displacement', x),
        settlementLow: Math.min(...settlements),
        settlementHigh: Math.max(...settlements),
      };
    });
  return { length, points };
}
