import type { Map as MapLibreMap } from 'maplibre-gl';
import { useEffect, useState } from 'react';
import { onceStill } from '../once-still.ts';

/** Whether the map is still drawing, and whether some of it did not come. */
export type MapState = { readonly isBusy: boolean; readonly hasGaps: boolean };

/** How far the map is with what it was asked to show. */
export function useMapState(map: MapLibreMap): MapState & { readonly forgetGaps: () => void } {
  const [state, setState] = useState<MapState>({ isBusy: true, hasGaps: false });
  useEffect(() => {
    function set(change: Partial<MapState>): void {
      setState((now) => ({ ...now, ...change }));
    }
    let stopWaiting: (() => void) | null = null;
    function waitUntilStill(): void {
      stopWaiting ??= onceStill(map, () => {
        stopWaiting = null;
        set({ isBusy: false });
      });
    }
    waitUntilStill();
    const subscriptions = [
      map.on('dataloading', () => {
        set({ isBusy: true });
        waitUntilStill();
      }),
      map.on('error', () => {
        set({ hasGaps: true });
      }),
    ];
    return () => {
      stopWaiting?.();
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
