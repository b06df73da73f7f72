import { useEffect } from 'react';
import type { MapController } from '../controller/map-controller.ts';
import type { LineShape, SectionShape } from '../map-line.ts';
import type { GridProjection } from '../place/grid-projection.ts';
import { lineFeatures } from '../style/line-features.ts';

/** Keeps the designed line and the mark of its section on the map; a map without them is left alone. */
export function useDrawnLine(
  controller: MapController,
  projection: GridProjection,
  line: readonly LineShape[] | undefined,
  section: readonly SectionShape[] | undefined,
): void {
  useEffect(() => {
    if (line !== undefined) controller.drawLine(lineFeatures(projection, line));
  }, [controller, projection, line]);
  useEffect(() => {
    if (section !== undefined) controller.drawSection(lineFeatures(projection, section));
  }, [controller, projection, section]);
}
