import { at } from '../numerics/at.ts';
import { MethodError } from '../method-error.ts';
import { cubicHermite } from '../numerics/cubic-hermite.ts';
import { writePolynomialHull } from '../numerics/polynomial-hull.ts';
import { quinticHermite } from '../numerics/quintic-hermite.ts';

/**
 * Coefficients per interval of a profile, in t from 0 to 1 along it: settlement (6), slope (5),
 * curvature (4), displacement along the wall (4) and horizontal strain (3).
 *
 * Units: none. Valid: a constant. Source: [own].
 */
export const PROFILE_STRIDE = 22;

/**
 * Where each polynomial starts among the coefficients of an interval, and its degree.
 *
 * Units: m, m/m, 1/m, m, m/m. Valid: read only. Source: [own].
 */
export const PROFILE = {
  settlement: { offset: 0, degree: 5 },
  slope: { offset: 6, degree: 4 },
  curvature: { offset: 11, degree: 3 },
  displacement: { offset: 15, degree: 3 },
  strain: { offset: 19, degree: 2 },
} as const;

/**
 * The name of a quantity in a profile.
 *
 * Units: none. Valid: a key of PROFILE. Source: [own].
 */
export type ProfileQuantity = keyof typeof PROFILE;

/**
 * The movement of the ground along a wall as polynomials between nodes: settlement agrees with the
 * field to its second derivative at each node, displacement to its first. Everything about zones is
 * found on it exactly.
 *
 * Units: nodes m from the wall's start. Valid: with nodes a quarter of the trough width apart the
 * settlement is right to 1e-7 and the curvature to 1e-4 of their largest. Source: [own].
 */
export type Profile = {
  readonly nodes: Float64Array;
  readonly coefficients: Float64Array;
  /** Per interval, two numbers between which its curvature surely stays. */
  readonly curvatureHull: Float64Array;
};

/**
 * Numbers per node from which a profile is made: settlement, slope, curvature, displacement along the
 * wall and horizontal strain along it.
 *
 * Units: m, m/m, 1/m, m, m/m. Valid: a constant. Source: [own].
 */
export const NODE_STRIDE = 5;

function hullOfCurvature(coefficients: Float64Array): Float64Array {
  const { offset, degree } = PROFILE.curvature;
  const intervals = coefficients.length / PROFILE_STRIDE;
  const hull = new Float64Array(2 * intervals);
  for (let k = 0; k < intervals; k++) {
    writePolynomialHull(coefficients, k * PROFILE_STRIDE + offset, degree, hull, 2 * k);
  }
  return hull;
}

function writeDerivative(c: Float64Array, from: number, degree: number, to: number, width: number) {
  for (let k = 1; k <= degree; k++) c[to + k - 1] = (k * at(c, from + k)) / width;
}

/**
 * A profile from the movements at its nodes.
 *
 * Units: see NODE_STRIDE. Valid: at least two nodes, growing. Source: [own], Hermite interpolation.
 */
export function profileFromNodes(nodes: Float64Array, values: Float64Array): Profile {
  const intervals = nodes.length - 1;
  const coefficients = new Float64Array(intervals * PROFILE_STRIDE);
  for (let k = 0; k < intervals; k++) {
    const width = at(nodes, k + 1) - at(nodes, k);
    const [a, b, o] = [k * NODE_STRIDE, (k + 1) * NODE_STRIDE, k * PROFILE_STRIDE];
    quinticHermite(
      coefficients,
      o,
      width,
      { value: at(values, a), slope: at(values, a + 1), curvature: at(values, a + 2) },
      { value: at(values, b), slope: at(values, b + 1), curvature: at(values, b + 2) },
    );
    writeDerivative(coefficients, o, 5, o + PROFILE.slope.offset, width);
    writeDerivative(coefficients, o + PROFILE.slope.offset, 4, o + PROFILE.curvature.offset, width);
    cubicHermite(
      coefficients,
      o + PROFILE.displacement.offset,
      width,
      { value: at(values, a + 3), slope: at(values, a + 4) },
      { value: at(values, b + 3), slope: at(values, b + 4) },
    );
    writeDerivative(
      coefficients,
      o + PROFILE.displacement.offset,
      3,
      o + PROFILE.strain.offset,
      width,
    );
  }
  return { nodes, coefficients, curvatureHull: hullOfCurvature(coefficients) };
}

/**
 * The profile of several fields together, each multiplied by a factor.
 *
 * Units: none. Valid: at least one profile, all on the same nodes, one factor each; throws
 * `bad-table`. Source: new-oreilly-1991, for
 * adding the movements of several drives.
 */
export function combineProfiles(profiles: readonly Profile[], factors: readonly number[]): Profile {
  const [first, ...others] = profiles;
  if (first === undefined) throw new MethodError('bad-table', 'There are no profiles to combine.');
  const scale = factors[0] ?? 0;
  const coefficients = first.coefficients.map((c) => scale * c);
  for (const [index, other] of others.entries()) {
    const factor = factors[index + 1] ?? 0;
    for (let k = 0; k < coefficients.length; k++) {
      coefficients[k] = at(coefficients, k) + factor * at(other.coefficients, k);
    }
  }
  return {
    nodes: first.nodes,
    coefficients,
    curvatureHull: hullOfCurvature(coefficients),
  };
}
