import type { LonLat } from './place/grid-projection.ts';

/** An outline drawn round buildings to ask for them. */
export type MapLasso = {
  readonly isDrawing: boolean;
  /** The outline that buildings are asked for by now. */
  readonly outline: readonly LonLat[] | null;
  /** The button was pressed: drawing begins or is left. */
  readonly onPress: () => void;
  readonly onLeave: () => void;
  readonly onClose: (outline: readonly LonLat[]) => void;
};
