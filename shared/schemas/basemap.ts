import { z } from 'zod';

/**
 * The layers of the demo's basemap, from the ground up.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const BASEMAP_LAYERS = [
  'water', 'land', 'quays', 'gardens', 'garden-walls', 'parks', 'trees', 'streets', 'places',
] as const; // prettier-ignore

/**
 * A layer of the demo's basemap.
 *
 * Units: none. Valid: one of BASEMAP_LAYERS. Source: [own].
 */
export type BasemapLayer = (typeof BASEMAP_LAYERS)[number];

const longitude = z.number().min(-180).max(180);
const latitude = z.number().min(-90).max(90);

/**
 * West, south, east and north of a piece of the map.
 *
 * Units: degrees of longitude and latitude, WGS 84. Valid: not over the date line. Source: [own].
 */
export const lonLatBoundsSchema = z.tuple([longitude, latitude, longitude, latitude]);

/**
 * West, south, east and north of a piece of the map.
 *
 * Units: as lonLatBoundsSchema. Valid: parsed by it. Source: [own].
 */
export type LonLatBounds = z.infer<typeof lonLatBoundsSchema>;

/**
 * What says where the tiles of a basemap are and how far they go; it lies beside them.
 *
 * Units: zooms of web maps. Valid: a tile outside of bounds and zooms is not there. Source: [own].
 */
export const basemapSchema = z.object({
  tiles: z.array(z.string()).length(1),
  bounds: lonLatBoundsSchema,
  minzoom: z.number().int(),
  maxzoom: z.number().int(),
});

/**
 * Where the tiles of a basemap are and how far they go.
 *
 * Units: as basemapSchema. Valid: parsed by it. Source: [own].
 */
export type Basemap = z.infer<typeof basemapSchema>;
