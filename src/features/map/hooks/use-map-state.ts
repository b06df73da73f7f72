import type { Map as MapLibreMap } from 'maplibre-gl';
import { useEffect, useState } from 'react';

/** Whether the map is still drawing, and whether some of it did not come. */
export type MapState = { readonly isBusy: boolean; readonly hasGaps: boolean };

/** How far the map is with what it was asked to show. */
export function useMapState(map: MapLibreMap): MapState & { readonly forgetGaps: () => void } {
  const [state, setState] = useState<MapState>({ isBusy: true, hasGaps: false });
  useEffect(() => {
    function set(change: Partial<MapState>): void {
      setState((now) => ({ ...now, ...change }));
    }
    const subscriptions = [
      map.on('dataloading', () => {
        set({ isBusy: true });
        // what changes nothing draws nothing, and without a frame the map never says that it is done
        map.triggerRepaint();
      }),
      map.on('dataabort', () => {
        map.triggerRepaint();
      }),
      map.on('idle', () => {
        set({ isBusy: false });
      }),
      map.on('error', () => {
        set({ hasGaps: true });
      }),
    ];
    return () => {
      for (const subscription of subscriptions) subscription.unsubscribe();
    };
  }, [map]);
  return {
    ...state,
    forgetGaps: () => {
      setState((now) => ({ ...now, hasGaps: false }));
    },
  };
}
