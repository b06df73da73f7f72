import type { BackgroundLayer } from '../../../shared/schemas/background.ts';

/** A layer of the background by name, and what its file may hold. */
export const LAYER_WORDS: Readonly<
  Record<BackgroundLayer, { readonly name: string; readonly holds: string }>
> = {
  streets: { name: 'Streets', holds: 'lines; a name is drawn along them' },
  water: { name: 'Water', holds: 'surfaces, and lines for streams' },
  rail: { name: 'Rail', holds: 'lines' },
  parks: { name: 'Parks', holds: 'surfaces' },
};
