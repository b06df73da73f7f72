import type { z } from 'zod';
import {
  BACKGROUND_LAYERS,
  type backgroundAnswerSchema,
  type BackgroundLayer,
  type backgroundLayersSchema,
} from '../../shared/schemas/background.ts';
import type { Scheme } from '../models/scheme.ts';

/** A layer after it was replaced. */
export function presentReplacedLayer(
  { backgroundVersion }: Scheme,
  layer: BackgroundLayer,
  features: number,
): z.infer<typeof backgroundAnswerSchema> {
  return { layer, features, backgroundVersion };
}

/** Every layer with how much it holds. */
export function presentBackground(
  counts: ReadonlyMap<string, number>,
): z.infer<typeof backgroundLayersSchema> {
  return BACKGROUND_LAYERS.map((layer) => ({ layer, features: counts.get(layer) ?? 0 }));
}
