/**
 * What the volume loss and the trough width parameter K of a new drive start from until somebody says what
 * the ground asks for.
 *
 * Units: volume loss m/m, K without unit. Valid: read only; they stand for no ground and are to be
 * replaced. Source: [common].
 */
export const FIRST_DRIVE_VALUES = {
  volumeLoss: { low: 0.005, central: 0.01, high: 0.015 },
  troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
} as const;
