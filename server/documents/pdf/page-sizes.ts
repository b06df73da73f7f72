/** Points in a millimetre; a point is a 72nd of an inch. */
export const POINTS_PER_MM = 72 / 25.4;

/** The sides of pages in points, upright. */
export const PAGE_SIZES = {
  A4: { width: 210 * POINTS_PER_MM, height: 297 * POINTS_PER_MM },
  A3: { width: 297 * POINTS_PER_MM, height: 420 * POINTS_PER_MM },
} as const;
