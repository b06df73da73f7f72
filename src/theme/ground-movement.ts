/** A number and the colour that stands for it on the map. */
export type Tint = readonly [number: number, colour: string];

/** How far a building came that was not let go at stage 1: let go at 2, or held to the end. */
export const STAGE_TINTS: readonly Tint[] = [
  [2, '#b9c4cf'],
  [3, '#53677c'],
];

/** Bands of settlement between the levels of contours, from the least: ink in water, never a damage colour. */
export const SETTLEMENT_TINTS: readonly Tint[] = [
  [0, '#e9eef2'],
  [1, '#d0d9e2'],
  [2, '#b3c1cf'],
  [3, '#92a5b8'],
  [4, '#6f869d'],
  [5, '#4d6680'],
  [6, '#2b4059'],
];
