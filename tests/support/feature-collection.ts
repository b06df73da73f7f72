import { z } from 'zod';

const position = z.tuple([z.number(), z.number()]);

/** The rings of a part: an outer one and its holes. */
const rings = z.array(z.array(position));

/** One part. */
export const polygonSchema = z.object({ type: z.literal('Polygon'), coordinates: rings });

/** One part or several. */
export const areaSchema = z.discriminatedUnion('type', [
  polygonSchema,
  z.object({ type: z.literal('MultiPolygon'), coordinates: z.array(rings) }),
]);

/** What an export as GeoJSON has to be, with the geometries that are awaited. */
export function collectionOf<G extends z.ZodType>(geometry: G) {
  return z.object({
    type: z.literal('FeatureCollection'),
    features: z.array(
      z.object({ id: z.string(), properties: z.record(z.string(), z.unknown()), geometry }),
    ),
  });
}
