/**
 * How far the method as a whole holds.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const VALIDITY: readonly string[] = [
  'Bored drives in soft ground. Shafts and boxes are not computed yet.',
  'Ground movement is greenfield: as if no building stood there. Walls are taken to follow it.',
  'More than one diameter of cover, walls founded above the crown.',
  'Movement of the short term, as the drive passes. What clay does over years is not in it.',
  'Walls are straight, whole, and founded at one level.',
  'The bracket covers the volume losses and K that are given. It cannot cover what nobody gave.',
];

/**
 * What goes on every sheet and notice, and into every file of results.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const CAUTIONS: readonly string[] = [
  'The method estimates ground movement empirically. It does not replace a visit, a survey of condition, or the judgement of a chartered engineer.',
  'Local codes, statutory procedures and licensed practice govern.',
  'Predictions are to be followed by measurements.',
];
