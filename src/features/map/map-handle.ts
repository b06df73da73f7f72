import type { Map as MapLibreMap } from 'maplibre-gl';
import { buildingsInView } from './buildings-in-view.ts';
import { bringIntoView, fitBounds, viewOf, zoomBy, type CameraBounds } from './camera.ts';
import { onceStill } from './once-still.ts';
import type { GridPlace, GridProjection } from './place/grid-projection.ts';
import { placeAtCentre } from './place/view-of-map.ts';

/** What the page may ask of the map. */
export type MapHandle = {
  readonly fit: (bounds: CameraBounds) => void;
  readonly zoomBy: (steps: number) => void;
  readonly bringIntoView: (bounds: CameraBounds) => void;
  /** Null while the map has not drawn all that it was asked to show. */
  readonly buildingsInView: () => readonly number[] | null;
  /** Tells once the map has drawn all; what it returns stops waiting. */
  readonly onceStill: (then: () => void) => () => void;
  /** What piece of ground is seen. */
  readonly view: () => CameraBounds;
  /** The grid in the middle of what is seen; null where the grid does not reach. */
  readonly middle: () => GridPlace | null;
};

export function handleOfMap(map: MapLibreMap, projection: GridProjection): MapHandle {
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
    buildingsInView: () => (map.loaded() ? buildingsInView(map) : null),
    onceStill: (then) => onceStill(map, then),
    view: () => viewOf(map),
    middle: () => placeAtCentre(map, projection),
  };
}
