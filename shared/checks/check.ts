import type { ReferenceKey } from '../references.ts';

/**
 * One figure of a check: what the source prints, what the product computes, and whether they agree to
 * the last digit printed.
 *
 * Units: `unit` names them. Valid: tolerance > 0. Source: [own].
 */
export type CheckRow = {
  readonly what: string;
  readonly unit: string;
  readonly expected: number;
  readonly computed: number;
  readonly tolerance: number;
  readonly agrees: boolean;
};

/**
 * A check of the product against something outside it. `run` computes with the public functions at the
 * moment it is called; nothing is kept.
 *
 * Units: as its rows. Valid: `provenance` says where the expected figures come from. Source: [own].
 */
export type Check = {
  readonly id: string;
  readonly name: string;
  readonly source: ReferenceKey;
  readonly provenance: string;
  readonly run: () => CheckRow[];
};

/**
 * A row with its verdict. Half a unit of the last digit printed is the usual tolerance.
 *
 * Units: those of the figure. Valid: tolerance > 0; a computed figure that is no number disagrees.
 * Source: [own].
 */
export function checkRow(
  what: string,
  unit: string,
  expected: number,
  computed: number,
  tolerance: number,
): CheckRow {
  return {
    what,
    unit,
    expected,
    computed,
    tolerance,
    agrees: Math.abs(computed - expected) <= tolerance,
  };
}
