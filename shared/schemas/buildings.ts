import { z } from 'zod';
import { footprintSchema } from './building-fields.ts';
import { buildingValuesShape } from './register.ts';

/**
 * The most buildings that a search answers with.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const MOST_BUILDINGS_FOUND = 20;

/**
 * Words to find buildings by: reference, name or address. Every word has to begin one of theirs.
 *
 * Units: none. Valid: upper and lower case and accents are alike; nothing finds nothing. Source: [own].
 */
export const buildingSearchSchema = z.object({
  search: z
    .string()
    .trim()
    .max(200)
    .regex(/^\P{Cc}*$/u)
    .default(''),
  limit: z.coerce.number().int().min(1).max(MOST_BUILDINGS_FOUND).default(MOST_BUILDINGS_FOUND),
});

/**
 * The address of one building; its number is also its feature id in the tiles.
 *
 * Units: none. Valid: whole numbers that the database can hold. Source: [own].
 */
export const buildingParamsSchema = z.object({
  schemeId: z.string(),
  buildingId: z.coerce.number().int().min(1).max(2_147_483_647),
});

const lonLat = z.tuple([z.number(), z.number()]);
const bounds = z.tuple([z.number(), z.number(), z.number(), z.number()]);

const buildingRow = {
  id: z.number(),
  reference: z.string(),
  name: z.string().nullable(),
  address: z.string().nullable(),
  centre: lonLat,
};

/**
 * The buildings found, the best first.
 *
 * Units: centre is longitude and latitude in degrees. Valid: at most MOST_BUILDINGS_FOUND.
 * Source: [own].
 */
export const buildingsFoundSchema = z.array(z.strictObject(buildingRow));

/**
 * A wall of a building: its letter, where it stands, how long it is, which way it runs, and the
 * buildings that stand against it.
 *
 * Units: start and end easting and northing m, length m, bearing degrees clockwise from grid north.
 * Valid: letters A to Z, then AA and on, part by part and ring by ring; a wall has no direction, so its
 * bearing is under 180. Source: [own].
 */
export const buildingWallSchema = z.strictObject({
  letter: z.string(),
  start: lonLat,
  end: lonLat,
  length: z.number(),
  bearing: z.number(),
  sharedWith: z.array(z.strictObject({ id: z.number(), reference: z.string() })),
});

/**
 * A wall of a building.
 *
 * Units: as buildingWallSchema. Valid: parsed by it. Source: [own].
 */
export type BuildingWall = z.infer<typeof buildingWallSchema>;

/**
 * One building of the register. What is null is unknown.
 *
 * Units: as buildingValuesShape; footprint easting and northing m: parts of outer ring and holes; centre
 * and bounds (west, south, east, north) in degrees. Valid: rings repeat their first corner.
 * Source: [own].
 */
export const buildingSchema = z.strictObject({
  ...buildingRow,
  ...buildingValuesShape,
  footprint: footprintSchema,
  bounds,
  walls: z.array(buildingWallSchema),
});

/**
 * Where a scheme is: round its buildings, else round its background, else where its system is used; and
 * what a map shows of it at first, which leaves out farms far from the town.
 *
 * Units: bounds and home are west, south, east, north in degrees; crs is an EPSG number. Valid: from tells
 * which; home lies among them. Source: [own].
 */
export const extentSchema = z.strictObject({
  bounds,
  home: bounds,
  crs: z.number(),
  from: z.enum(['buildings', 'background', 'crs']),
});

/**
 * One building that was found.
 *
 * Units: as buildingsFoundSchema. Valid: parsed by it. Source: [own].
 */
export type BuildingRow = z.infer<typeof buildingsFoundSchema>[number];

/**
 * One building of the register.
 *
 * Units: as buildingSchema. Valid: parsed by it. Source: [own].
 */
export type BuildingAnswer = z.infer<typeof buildingSchema>;

/**
 * Where a scheme is.
 *
 * Units: as extentSchema. Valid: parsed by it. Source: [own].
 */
export type ExtentAnswer = z.infer<typeof extentSchema>;
