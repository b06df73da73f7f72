import type { Map as MapLibreMap, MapMouseEvent } from 'maplibre-gl';
import { useEffect, useEffectEvent } from 'react';
import type { GridPlace, GridProjection } from '../place/grid-projection.ts';
import { gridPlaceAt } from '../place/view-of-map.ts';

/** Tells of each place of the grid that the cursor is over while the map stands still. */
export function useCursorPlace(
  map: MapLibreMap,
  projection: GridProjection,
  onCursor: ((place: GridPlace) => void) | undefined,
): void {
  const tell = useEffectEvent(({ point }: MapMouseEvent) => {
    if (onCursor === undefined || map.isMoving()) return;
    const place = gridPlaceAt(map, projection, point.x, point.y);
    if (place !== null) onCursor(place);
  });
  useEffect(() => {
    const moves = map.on('mousemove', (event) => {
      tell(event);
    });
    return () => {
      moves.unsubscribe();
    };
  }, [map]);
}
