import type { Map as MapLibreMap, MapMouseEvent, MapTouchEvent } from 'maplibre-gl';
import type { AimRequest, Handle } from '../map-drawing.ts';
import type { GridProjection } from '../place/grid-projection.ts';
import { aimRequest } from './aim-request.ts';
import { FINGER_REACH, handleAt, MOUSE_REACH } from './handle-at.ts';
import { isByFinger, type DraftHost } from './mode.ts';

/** Less than this is a press and no drag, in pixels. */
const STILL = 3;

type PointerEventOfMap = MapMouseEvent | MapTouchEvent;
type Held = { readonly handle: Handle; readonly x: number; readonly y: number };

/** Corners are dragged, and middles of sides become corners; a press on one is told as that. */
export function installOutlineMode(
  map: MapLibreMap,
  projection: GridProjection,
  host: DraftHost,
): () => void {
  const canvas = map.getCanvas();
  let held: Held | null = null;
  let last: AimRequest | null = null;

  function reachOf({ originalEvent }: PointerEventOfMap): number {
    return isByFinger(originalEvent) ? FINGER_REACH : MOUSE_REACH;
  }
  function take(event: PointerEventOfMap): void {
    const handle = handleAt(map, projection, host.handles(), event.point, reachOf(event));
    if (handle === null || ('points' in event && event.points.length > 1)) return;
    // the map stays where it is
    event.preventDefault();
    [held, last] = [{ handle, x: event.point.x, y: event.point.y }, null];
  }
  function move(event: PointerEventOfMap): void {
    const { point, originalEvent } = event;
    if (held === null) {
      const over = handleAt(map, projection, host.handles(), point, MOUSE_REACH);
      canvas.style.cursor = over === null ? '' : 'move';
      return;
    }
    if (last === null && Math.hypot(point.x - held.x, point.y - held.y) < STILL) return;
    last = aimRequest(map, projection, point, reachOf(event), originalEvent.shiftKey, held.handle);
    host.show(last);
  }
  function drop(): void {
    if (held === null) return;
    if (last === null) host.press(held.handle);
    else host.put(last);
    [held, last] = [null, null];
  }
  function leave(): void {
    [held, last] = [null, null];
    host.show(null);
  }

  map.boxZoom.disable();
  const subscriptions = [
    map.on('mousedown', take),
    map.on('touchstart', take),
    map.on('mousemove', move),
    map.on('touchmove', move),
    map.on('mouseup', drop),
    map.on('touchend', drop),
    map.on('touchcancel', leave),
    map.on('mouseout', leave),
  ];
  return () => {
    for (const subscription of subscriptions) subscription.unsubscribe();
    map.boxZoom.enable();
    canvas.style.cursor = '';
    host.show(null);
  };
}
