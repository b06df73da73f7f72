/**
 * A number and the colour that stands for it, on the map and on paper.
 *
 * Units: colour as CSS writes it. Valid: read only. Source: [own].
 */
export type Tint = readonly [number: number, colour: string];

/**
 * How far a building came that was not let go at stage 1: let go at 2, or held to the end.
 *
 * Units: stages. Valid: read only. Source: [own].
 */
export const STAGE_TINTS: readonly Tint[] = [
  [2, '#b9c4cf'],
  [3, '#53677c'],
];

/**
 * Bands of settlement between the levels of contours, from the least: ink in water, never a damage colour.
 * They darken from one to the next, so that a copy in greys reads alike.
 *
 * Units: places of CONTOUR_LEVELS. Valid: read only. Source: [own].
 */
export const SETTLEMENT_TINTS: readonly Tint[] = [
  [0, '#e9eef2'],
  [1, '#d0d9e2'],
  [2, '#b3c1cf'],
  [3, '#92a5b8'],
  [4, '#6f869d'],
  [5, '#4d6680'],
  [6, '#2b4059'],
];
