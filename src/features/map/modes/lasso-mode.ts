import type { Map as MapLibreMap, MapMouseEvent, MapTouchEvent } from 'maplibre-gl';
import type { GridPlace, GridProjection } from '../place/grid-projection.ts';
import { gridPlaceAt } from '../place/view-of-map.ts';
import { FINGER_REACH, MOUSE_REACH } from './handle-at.ts';
import { isByFinger } from './mode.ts';

/** What the lasso asks and tells. */
export type LassoHost = {
  /** What is drawn so far. */
  readonly places: () => readonly GridPlace[];
  /** The pointer is over a place, or over none. */
  readonly show: (place: GridPlace | null) => void;
  readonly add: (place: GridPlace) => void;
  readonly close: () => void;
};

/** Less than this is a press and no drag, in pixels; the map takes it alike. */
const STILL = 3;
/** What has fewer steps encloses nothing. */
const LEAST = 3;

type Pixel = { readonly x: number; readonly y: number };
type Stroke = { readonly start: Pixel; readonly last: Pixel; readonly steps: number };
type PointerEventOfMap = MapMouseEvent | MapTouchEvent;

function apart(a: Pixel, b: Pixel): number {
  return Math.hypot(a.x - b.x, a.y - b.y);
}

/** Whether the pointer is back at the place that the outline began with. */
function isBack(
  map: MapLibreMap,
  projection: GridProjection,
  places: readonly GridPlace[],
  { point, originalEvent }: MapMouseEvent,
): boolean {
  const [first] = places;
  const lonLat = first === undefined ? null : projection.toLonLat(first);
  if (lonLat === null || places.length < LEAST) return false;
  const reach = isByFinger(originalEvent) ? FINGER_REACH : MOUSE_REACH;
  return apart(map.project([lonLat[0], lonLat[1]]), point) <= reach;
}

/** A stroke as the pointer is drawn over the map. */
function strokes(placeAt: (pixel: Pixel) => GridPlace | null, host: LassoHost) {
  let stroke: Stroke | null = null;

  function add(pixel: Pixel): void {
    const place = placeAt(pixel);
    if (place !== null) host.add(place);
  }
  function lift(): void {
    const { steps } = stroke ?? { steps: 0 };
    stroke = null;
    if (steps >= LEAST) host.close();
  }
  return {
    add,
    lift,
    take: (event: PointerEventOfMap): void => {
      stroke = null;
      // two fingers move the map
      if ('points' in event && event.points.length > 1) return;
      event.preventDefault();
      stroke = { start: event.point, last: event.point, steps: 0 };
    },
    move: ({ point }: PointerEventOfMap): void => {
      if (stroke === null) {
        host.show(placeAt(point));
        return;
      }
      const { start, last, steps } = stroke;
      if (apart(last, point) < STILL) return;
      if (steps === 0) add(start);
      add(point);
      stroke = { start, last: point, steps: steps + 1 };
      host.show(null);
    },
    drop: ({ point }: MapMouseEvent): void => {
      // a click follows there, which tells whether the outline is closed
      if (stroke !== null && apart(stroke.start, point) < STILL) stroke = null;
      else lift();
    },
    leave: (): void => {
      stroke = null;
      host.show(null);
    },
  };
}

/** Each press sets a corner, a drag draws freehand; back at the first place, or let go, it closes. */
export function installLassoMode(
  map: MapLibreMap,
  projection: GridProjection,
  host: LassoHost,
): () => void {
  const canvas = map.getCanvas();
  const drawn = strokes(({ x, y }) => gridPlaceAt(map, projection, x, y), host);

  function click(event: MapMouseEvent): void {
    if (isBack(map, projection, host.places(), event)) host.close();
    else drawn.add(event.point);
  }
  map.doubleClickZoom.disable();
  map.boxZoom.disable();
  canvas.style.cursor = 'crosshair';
  const subscriptions = [
    map.on('mousedown', drawn.take),
    map.on('touchstart', drawn.take),
    map.on('mousemove', drawn.move),
    map.on('touchmove', drawn.move),
    map.on('mouseup', drawn.drop),
    map.on('touchend', drawn.lift),
    map.on('click', click),
    map.on('touchcancel', drawn.leave),
    map.on('mouseout', drawn.leave),
  ];
  return () => {
    for (const subscription of subscriptions) subscription.unsubscribe();
    map.doubleClickZoom.enable();
    map.boxZoom.enable();
    canvas.style.cursor = '';
  };
}
