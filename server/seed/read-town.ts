import { readFileSync } from 'node:fs';
import path from 'node:path';
import { z } from 'zod';

/** The town's file says "unknown" where a register says nothing. */
const text = z
  .string()
  .nullable()
  .transform((words) => (words === 'unknown' ? null : words));
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
  return features.map(({ properties: { reference, listed, ...others }, geometry }) => {
    const attributes = { ...others, listedGrade: listed };
    // as after an import: a later file is held against what this one said
    return { reference, attributes, imported: attributes, footprint: [geometry.coordinates] };
  });
}
