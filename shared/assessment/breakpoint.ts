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
/** A rise and fall of the strain within this share of a factor is not looked for. */
const FINEST_STEP = 1e-4;

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

type Walk = {
  /** The strain at a factor less the limiting strain. */
  readonly excess: (factor: number) => number;
  readonly limit: number;
};

/**
 * The first factor in a step at which the limit is reached. While its zones stay the same a strain grows as
 * the factor, so a stretch can hold the limit only if that reaches it, or if its end does; such a stretch is
 * halved and the lower half searched first.
 */
function firstReached(
  walk: Walk,
  from: number,
  excessFrom: number,
  to: number,
  endReaches: boolean,
): number | undefined {
  const { excess, limit } = walk;
  const mayReach = atOrAbove(((excessFrom + limit) * to) / from, limit);
  if (!endReaches && (!mayReach || to - from <= FINEST_STEP * to)) return undefined;
  if (to - from <= TOLERANCE * to) return to;
  const middle = (from + to) / 2;
  const found = excess(middle);
  if (atOrAbove(found, 0)) return firstReached(walk, from, excessFrom, middle, true);
  return (
    firstReached(walk, from, excessFrom, middle, false) ??
    firstReached(walk, middle, found, to, endReaches)
  );
}

/**
 * The smallest factor on all central volume losses together at which a wall reaches the category that
 * leads on, in one state of the ground and at one E/G; undefined up to `most`. The strain jumps where a zone
 * appears or joins, up or down, so the factor is walked upwards and every step that may reach the limit is
 * searched from its lower end; it is never taken from strain/limit.
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
  let from = limit / strainBound(loaded, field.length, wall.height, eOverG);
  if (!(from < most)) return undefined;
  let excessFrom = excess(from);
  if (atOrAbove(excessFrom, 0)) return from;
  while (from < most) {
    const to = Math.min(most, from * STEP);
    const excessTo = excess(to);
    const walk = { excess, limit };
    const first = firstReached(walk, from, excessFrom, to, atOrAbove(excessTo, 0));
    if (first !== undefined) return first;
    [from, excessFrom] = [to, excessTo];
  }
  return undefined;
}
