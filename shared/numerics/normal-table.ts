import { normalDensity } from './normal-density.ts';
import { normalDistribution } from './normal-distribution.ts';

/**
 * Nodes per unit of the table of Φ and φ.
 *
 * Units: 1. Valid: with 32 the four terms of the Taylor series round a node leave under 1e-11.
 * Source: [own].
 */
export const NODES_PER_UNIT = 32;

/**
 * The table runs from minus to plus this argument; beyond it Φ is 0 or 1 and φ is 0 to 1e-16.
 *
 * Units: 1. Valid: a constant. Source: [own].
 */
export const TABLE_REACH = 8.5;

/**
 * Φ and φ by turns at each node x = k / NODES_PER_UNIT − TABLE_REACH. The kernel expands them round
 * the nearest node; the derivatives of φ are φ times Hermite polynomials, so two numbers serve all.
 *
 * Units: 1. Valid: read only. Source: [own].
 */
export const NORMAL_TABLE: Float64Array = tabulate();

function tabulate(): Float64Array {
  const nodes = 2 * TABLE_REACH * NODES_PER_UNIT + 2;
  const table = new Float64Array(2 * nodes);
  for (let k = 0; k < nodes; k++) {
    const x = k / NODES_PER_UNIT - TABLE_REACH;
    table[2 * k] = normalDistribution(x);
    table[2 * k + 1] = normalDensity(x);
  }
  return table;
}
