import type { Map as MapLibreMap } from 'maplibre-gl';
import type { Segment } from '../../../shared/geometry/point.ts';
import { buildingsInView } from './buildings-in-view.ts';
import { buildingsOn, type StandsOn } from './buildings-on.ts';
import { bringIntoView, fitBounds, viewOf, zoomBy, type CameraBounds } from './camera.ts';
import type { GridProjection } from './place/grid-projection.ts';

/** What the page may ask of the map. */
export type MapHandle = {
  readonly fit: (bounds: CameraBounds) => void;
  readonly zoomBy: (steps: number) => void;
  readonly bringIntoView: (bounds: CameraBounds) => void;
  readonly buildingsInView: () => number[];
  /** Where the buildings in view stand on a line, in metres along it from its start. */
  readonly buildingsOn: (line: Segment) => readonly StandsOn[];
  /** What piece of ground is seen. */
  readonly view: () => CameraBounds;
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
    buildingsInView: () => buildingsInView(map),
    buildingsOn: (line) => buildingsOn(map, projection, line),
    view: () => viewOf(map),
  };
}
