import { readFileSync } from 'node:fs';
import path from 'node:path';
import { z } from 'zod';

const text = z.string().nullable();
const point = z.tuple([z.number(), z.number()]);

const townSchema = z.object({
  features: z.array(
    z.object({
      properties: z.object({
        reference: z.string(),
        name: text,
        address: text,
        use: text,
        storeys: z.number().nullable(),
        eavesHeight: z.number().nullable(),
        groundLevel: z.number().nullable(),
        foundingLevel: z.number().nullable(),
        foundation: text,
        construction: text,
        listed: text,
        condition: text,
      }),
      geometry: z.object({ type: z.literal('Polygon'), coordinates: z.array(z.array(point)) }),
    }),
  ),
});

/** The buildings of the demo town, as they stand in its file, with footprints in the scheme's grid. */
export function readTown(folder: string) {
  const file = path.join(folder, 'buildings.geojson');
  const { features } = townSchema.parse(JSON.parse(readFileSync(file, 'utf8')));
  return features.map(({ properties: { listed, ...others }, geometry }) => ({
    ...others,
    listedGrade: listed,
    footprint: [geometry.coordinates],
  }));
}
