import { z } from 'zod';

/**
 * The layers of a scheme's background map.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const BACKGROUND_LAYERS = ['streets', 'water', 'rail', 'parks'] as const;

/**
 * What an upload for the background may hold.
 *
 * Units: bytes, features. Valid: read only. Source: [own].
 */
export const BACKGROUND_LIMITS = { bytes: 20 * 1024 * 1024, features: 200_000 } as const;

/**
 * A layer of the background map.
 *
 * Units: none. Valid: one of BACKGROUND_LAYERS. Source: [own].
 */
export const backgroundLayerSchema = z.enum(BACKGROUND_LAYERS);

/**
 * The address of a layer of a scheme's background.
 *
 * Units: none. Valid: one of BACKGROUND_LAYERS. Source: [own].
 */
export const backgroundParamsSchema = z.object({
  schemeId: z.string(),
  layer: backgroundLayerSchema,
});

/**
 * A layer after an upload, with the version that its tiles are now served under.
 *
 * Units: none. Valid: features 0 after the layer was removed. Source: [own].
 */
export const backgroundAnswerSchema = z.strictObject({
  layer: backgroundLayerSchema,
  features: z.number(),
  backgroundVersion: z.number(),
});

/**
 * Every layer of a scheme's background with how much it holds.
 *
 * Units: none. Valid: in the order of BACKGROUND_LAYERS. Source: [own].
 */
export const backgroundLayersSchema = z.array(
  z.strictObject({ layer: backgroundLayerSchema, features: z.number() }),
);

/**
 * A layer of the background map.
 *
 * Units: none. Valid: one of BACKGROUND_LAYERS. Source: [own].
 */
export type BackgroundLayer = z.infer<typeof backgroundLayerSchema>;
