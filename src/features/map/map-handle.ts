import type { Map as MapLibreMap } from 'maplibre-gl';
import { buildingsInView } from './buildings-in-view.ts';
import { bringIntoView, fitBounds, viewOf, zoomBy, type CameraBounds } from './camera.ts';

/** What the page may ask of the map. */
export type MapHandle = {
  readonly fit: (bounds: CameraBounds) => void;
  readonly zoomBy: (steps: number) => void;
  readonly bringIntoView: (bounds: CameraBounds) => void;
  readonly buildingsInView: () => number[];
  /** What piece of ground is seen. */
  readonly view: () => CameraBounds;
};

export function handleOfMap(map: MapLibreMap): MapHandle {
  return {
    fit: (bounds) => {
      fitBounds(map, bounds);
    },
    zoomBy: (steps) => {
      zoomBy(map, steps);
    },
    bringIntoView: (bounds) => {
      bringIntoView(map, bounds);
    },
    buildingsInView: () => buildingsInView(map),
    view: () => viewOf(map),
  };
}
