/**
 * What the method takes at most and at least, so that a slip of units is refused by name.
 *
 * Units: coordinates, levels and lengths m; volumeLoss m/m. Valid: read only. Source: [own], except
 * the later factor's, which is [common].
 */
export const LIMITS = {
  coordinate: 100_000_000,
  level: 10_000,
  diameter: 30,
  volumeLoss: 0.2,
  troughWidth: 2,
  height: 500,
  wallLength: 0.001,
  eOverG: 1000,
  poisson: 0.5,
  laterFactor: 1.6,
  faceShare: { least: 0.01, most: 0.99 },
  cutOff: 1,
  drives: 100,
  axisPoints: 100_000,
  walls: 1_000_000,
} as const;
