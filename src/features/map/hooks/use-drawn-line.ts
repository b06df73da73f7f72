import { useEffect } from 'react';
import type { MapController } from '../controller/map-controller.ts';
import type { LineShape } from '../map-line.ts';
import type { GridProjection } from '../place/grid-projection.ts';
import { lineFeatures } from '../style/line-features.ts';

/** Keeps the designed line on the map; a map without one is left alone. */
export function useDrawnLine(
  controller: MapController,
  projection: GridProjection,
  line: readonly LineShape[] | undefined,
): void {
  useEffect(() => {
    if (line !== undefined) controller.drawLine(lineFeatures(projection, line));
  }, [controller, projection, line]);
}
