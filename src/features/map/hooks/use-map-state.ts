import type { Map as MapLibreMap } from 'maplibre-gl';
import { useCallback, useEffect, useRef, useState } from 'react';
import type { MissedTiles } from '../missed-tiles.ts';
import { onceStill } from '../once-still.ts';

/** Whether the map is still drawing, and whether some of it did not come. */
export type MapState = { readonly isBusy: boolean; readonly hasGaps: boolean };

/** How far the map is with what it was asked to show, and how to ask again for what did not come. */
export function useMapState(
  map: MapLibreMap,
  missed: MissedTiles,
): MapState & { readonly fetchAgain: () => void } {
  const [state, setState] = useState<MapState>({ isBusy: true, hasGaps: false });
  const stopWaiting = useRef<(() => void) | null>(null);
  const tellOnceStill = useCallback(() => {
    stopWaiting.current ??= onceStill(map, () => {
      stopWaiting.current = null;
      setState((now) => ({ ...now, isBusy: false }));
    });
  }, [map]);
  useEffect(() => {
    tellOnceStill();
    const subscriptions = [
      map.on('dataloading', () => {
        setState((now) => ({ ...now, isBusy: true }));
        tellOnceStill();
      }),
      map.on('error', (fault) => {
        missed.note(fault);
        setState((now) => ({ ...now, hasGaps: true }));
      }),
    ];
    return () => {
      stopWaiting.current?.();
      stopWaiting.current = null;
      for (const subscription of subscriptions) subscription.unsubscribe();
    };
  }, [map, missed, tellOnceStill]);
  return {
    ...state,
    fetchAgain: () => {
      setState({ isBusy: true, hasGaps: false });
      tellOnceStill();
      missed.fetchAgain();
    },
  };
}
