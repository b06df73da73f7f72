import { normalDensity } from './normal-density.ts';
import { normalDistribution } from './normal-distribution.ts';

/**
 * Nodes per unit of the table of Φ and φ.
 *
 * Units: 1. Valid: with 40 the terms kept of the Taylor series round a node leave under 1e-11
 * of Φ and of φ.
 * Source: [own].
 */
export const NODES_PER_UNIT = 40;

/**
 * The distance between nodes, as a factor: the kernel cannot afford a division.
 *
 * Units: 1. Valid: a constant. Source: [own].
 */
export const NODE_STEP = 1 / NODES_PER_UNIT;

/**
 * The table runs from minus to plus this argument; beyond it Φ is 0 or 1 and φ is 0 to 1e-16.
 *
 * Units: 1. Valid: a constant. Source: [own].
 */
export const TABLE_REACH = 8.5;

/**
 * Numbers per node: Φ, then the terms of φ's Taylor series round the node up to the fourth power.
 *
 * Units: none. Valid: a constant. Source: [own].
 */
export const NORMAL_TABLE_STRIDE = 6;

/**
 * At each node x = k · NODE_STEP − TABLE_REACH: Φ, φ and the Taylor terms of φ, which are φ times
 * Hermite polynomials. With d the distance from the node, φ = t₁ + t₂d + … + t₅d⁴ and, integrated,
 * Φ = t₀ + t₁d + t₂d²/2 + t₃d³/3 + t₄d⁴/4.
 *
 * Units: 1. Valid: read only. Source: [own]; the terms are abramowitz-stegun-1964, 26.2.31.
 */
export const NORMAL_TABLE: Float64Array = tabulate();

function tabulate(): Float64Array {
  const nodes = 2 * TABLE_REACH * NODES_PER_UNIT + 2;
  const table = new Float64Array(NORMAL_TABLE_STRIDE * nodes);
  for (let k = 0; k < nodes; k++) {
    const x = k * NODE_STEP - TABLE_REACH;
    const phi = normalDensity(x);
    const square = x * x;
    const terms = [
      normalDistribution(x),
      phi,
      -x * phi,
      ((square - 1) / 2) * phi,
      (((3 - square) * x) / 6) * phi,
      ((square * square - 6 * square + 3) / 24) * phi,
    ];
    table.set(terms, k * NORMAL_TABLE_STRIDE);
  }
  return table;
}
