import type { GridPlace } from './place/grid-projection.ts';

/** Who says more of the place under the cursor, and who follows it. */
export type MapCursor = {
  readonly wordsAt: (place: GridPlace) => readonly string[];
  readonly onPlace: (place: GridPlace) => void;
};
