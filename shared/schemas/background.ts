import { z } from 'zod';

/**
 * The layers of a scheme's background map.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const BACKGROUND_LAYERS = ['streets', 'water', 'rail', 'parks'] as const;

/**
 * A layer of the background map.
 *
 * Units: none. Valid: one of BACKGROUND_LAYERS. Source: [own].
 */
export const backgroundLayerSchema = z.enum(BACKGROUND_LAYERS);

/**
 * A layer of the background map.
 *
 * Units: none. Valid: one of BACKGROUND_LAYERS. Source: [own].
 */
export type BackgroundLayer = z.infer<typeof backgroundLayerSchema>;
