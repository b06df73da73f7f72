/**
 * The three levels on which the trough width and the focus depend: the ground at the wall, the
 * wall's founding and the axis of a piece of drive. Axis depth z0 = ground − axis, depth of the
 * founding z = ground − founding, height over the axis h = z0 − z = founding − axis.
 *
 * Units: m above datum. Valid: founding ≤ ground. Source: [own].
 */
export type Levels = {
  readonly ground: number;
  readonly founding: number;
  readonly axis: number;
};
