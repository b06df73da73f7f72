import type { Map as MapLibreMap } from 'maplibre-gl';
import { useCallback, useSyncExternalStore } from 'react';

/** A figure or word that follows the map as it moves. */
export function useMapFigure<T extends string | number | null>(map: MapLibreMap, read: () => T): T {
  const subscribe = useCallback(
    (changed: () => void) => {
      const moves = map.on('move', changed);
      const sizes = map.on('resize', changed);
      return () => {
        moves.unsubscribe();
        sizes.unsubscribe();
      };
    },
    [map],
  );
  return useSyncExternalStore(subscribe, read);
}
