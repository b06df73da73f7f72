/**
 * A point in plan: easting, northing in the scheme's grid.
 *
 * Units: m. Valid: finite, a projected system in metres. Source: [own].
 */
export type PlanPoint = readonly [easting: number, northing: number];

/**
 * A point in space: easting, northing, level above the scheme datum.
 *
 * Units: m. Valid: finite. Source: [own].
 */
export type SpacePoint = readonly [easting: number, northing: number, level: number];

/**
 * A straight line in plan between two points.
 *
 * Units: m. Valid: the ends may coincide unless a function says otherwise. Source: [own].
 */
export type Segment = { readonly start: PlanPoint; readonly end: PlanPoint };
