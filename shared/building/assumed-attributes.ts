/**
 * What is known of a building; what is missing takes a default and is marked as assumed.
 *
 * Units: heights and depths m, eOverG and poisson without unit. Valid: each > 0 where given.
 * Source: [own].
 */
export type KnownAttributes = {
  readonly storeys?: number;
  readonly eavesHeight?: number;
  readonly foundingDepth?: number;
  readonly eOverG?: number;
  readonly poisson?: number;
};

/**
 * A building's attributes made whole, with the names of those that are assumed.
 *
 * Units: as KnownAttributes; height is from founding level to eaves. Valid: made by
 * `completeAttributes`. Source: [common].
 */
export type CompleteAttributes = {
  readonly storeys: number;
  readonly eavesHeight: number;
  readonly foundingDepth: number;
  readonly eOverG: number;
  readonly poisson: number;
  readonly height: number;
  readonly assumed: readonly (keyof KnownAttributes)[];
};

/**
 * What is assumed where nothing is known: founded 1.0 m below ground, two storeys of 3.0 m to the
 * eaves, masonry with E/G 2.6 and Poisson's ratio 0.3.
 *
 * Units: m and none. Valid: read only. Source: [common]; E/G of masonry burland-wroth-1974.
 */
export const ASSUMED = {
  foundingDepth: 1,
  storeys: 2,
  storeyHeight: 3,
  eOverG: 2.6,
  poisson: 0.3,
} as const;

/**
 * Fills in what is missing. Eaves follow from the storeys, known or assumed; the height of a wall is
 * eaves height plus founding depth.
 *
 * Units: m. Valid: any known attributes. Source: [common].
 */
export function completeAttributes(known: KnownAttributes): CompleteAttributes {
  const storeys = known.storeys ?? ASSUMED.storeys;
  const eavesHeight = known.eavesHeight ?? storeys * ASSUMED.storeyHeight;
  const foundingDepth = known.foundingDepth ?? ASSUMED.foundingDepth;
  const names = ['storeys', 'eavesHeight', 'foundingDepth', 'eOverG', 'poisson'] as const;
  return {
    storeys,
    eavesHeight,
    foundingDepth,
    eOverG: known.eOverG ?? ASSUMED.eOverG,
    poisson: known.poisson ?? ASSUMED.poisson,
    height: eavesHeight + foundingDepth,
    assumed: names.filter((name) => known[name] === undefined),
  };
}
