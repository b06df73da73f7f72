import type { Map as MapLibreMap } from 'maplibre-gl';
import { useEffect } from 'react';
import type { MapController } from '../controller/map-controller.ts';
import { gridCrosses } from '../place/grid-crosses.ts';
import type { GridProjection } from '../place/grid-projection.ts';
import { gridBoundsOfView, metresPerPixel } from '../place/view-of-map.ts';

/** Keeps the crosses of the grid under what is in view. */
export function useGridCrosses(
  map: MapLibreMap,
  controller: MapController,
  projection: GridProjection,
): void {
  useEffect(() => {
    function draw(): void {
      const bounds = gridBoundsOfView(map, projection);
      const scale = metresPerPixel(map, projection);
      if (bounds !== null && scale !== null) {
        controller.drawGrid(gridCrosses(projection, bounds, scale));
      }
    }
    draw();
    const moves = map.on('moveend', draw);
    const sizes = map.on('resize', draw);
    return () => {
      moves.unsubscribe();
      sizes.unsubscribe();
    };
  }, [map, controller, projection]);
}
