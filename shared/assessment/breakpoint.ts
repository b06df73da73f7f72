import { polynomialBound } from '../numerics/polynomial-bound.ts';
import {
  PROFILE,
  PROFILE_STRIDE,
  type Profile,
  type ProfileQuantity,
} from '../building/profile.ts';
import type { Wall } from '../building/wall.ts';
import { limitingStrain } from '../damage/category-of-strain.ts';
import { atOrAbove } from '../damage/at-or-above.ts';
import type { LoadedProfile } from './loaded-profile.ts';
import type { AssessmentRules } from './rules.ts';
import { largestStrain, shapesOfWall } from './shapes-of-wall.ts';
import type { WallField } from './wall-field.ts';

/** Each step of the walk multiplies the volume loss by this. */
const STEP = 1.1;
const TOLERANCE = 1e-6;

function largestOf(profile: Profile, quantity: ProfileQuantity): number {
  const { offset, degree } = PROFILE[quantity];
  let largest = 0;
  for (let o = offset; o < profile.coefficients.length; o += PROFILE_STRIDE) {
    largest = Math.max(largest, polynomialBound(profile.coefficients, o, degree));
  }
  return largest;
}

/**
 * A strain that no zone of a wall can pass, whatever its ends: Δ/L is at most κL/8, so bending is at
 * most 1.5 κH and shear at most the lesser of κL/8 and κH√(6·E/G)/16; the horizontal strain adds at
 * most its own largest size. It only saves walking where nothing can happen.
 *
 * Units: m/m for the loaded profile. Valid: any zone within the wall. Source: [own].
 */
export function strainBound(
  { profile, scale }: LoadedProfile,
  length: number,
  height: number,
  eOverG: number,
): number {
  const shear = Math.min(length / 8, (height * Math.sqrt(6 * eOverG)) / 16);
  const perCurvature = Math.max(1.5 * height, shear);
  return scale * (largestOf(profile, 'curvature') * perCurvature + largestOf(profile, 'strain'));
}

/**
 * The smallest factor on all central volume losses together at which a wall reaches the category that
 * leads on, in one state of the ground and at one E/G; undefined up to `most`. The strain jumps where
 * a zone appears or joins, so the factor is walked upwards and the step that reaches is bisected; it
 * is never taken from strain/limit.
 *
 * Units: none. Valid: `loaded` at the central volume loss; most > 0. Source: [own].
 */
export function breakpointFactor(
  field: WallField,
  loaded: LoadedProfile,
  wall: Wall,
  eOverG: number,
  rules: AssessmentRules,
  most: number,
): number | undefined {
  const limit = limitingStrain(rules.leadingCategory);
  const excess = (factor: number): number => {
    const scaled = { profile: loaded.profile, scale: factor * loaded.scale };
    return largestStrain(shapesOfWall(scaled, field.cutOff, rules), wall, eOverG) - limit;
  };
  let below = limit / strainBound(loaded, field.length, wall.height, eOverG) / STEP;
  if (!(below < most)) return undefined;
  let above = below;
  let excessAbove = excess(above);
  let excessBelow = -limit;
  while (!atOrAbove(excessAbove, 0)) {
    if (above >= most) return undefined;
    [below, excessBelow] = [above, excessAbove];
    above = Math.min(most, above * STEP);
    excessAbove = excess(above);
  }
  for (let turn = 0; above - below > TOLERANCE * above; turn++) {
    const secant = above - ((above - below) * excessAbove) / (excessAbove - excessBelow);
    const middle = turn % 2 === 0 ? secant * (1 + TOLERANCE / 4) : (below + above) / 2;
    const inside = middle > below && middle < above ? middle : (below + above) / 2;
    const found = excess(inside);
    if (atOrAbove(found, 0)) [above, excessAbove] = [inside, found];
    else [below, excessBelow] = [inside, found];
  }
  return above;
}
