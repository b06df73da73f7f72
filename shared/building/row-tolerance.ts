/**
 * What counts as one wall, and as one line, when façades are joined into rows: the largest angle, the
 * largest distance across and between ends, and the length over which walls must overlap to be shared.
 *
 * Units: angle in radians, offset and overlap m. Valid: 0 < angle ≤ π/4, offset > 0, overlap ≥ 0.
 * Source: [own].
 */
export type RowTolerance = {
  readonly angle: number;
  readonly offset: number;
  readonly overlap: number;
};

/**
 * The tolerance of the method: 5 degrees, 0.5 m, 0.5 m.
 *
 * Units: angle in radians, offset and overlap m. Valid: a constant. Source: [common].
 */
export const ROW_TOLERANCE: RowTolerance = { angle: Math.PI / 36, offset: 0.5, overlap: 0.5 };
