import type { Map as MapLibreMap, MapMouseEvent } from 'maplibre-gl';
import type { AimRequest } from '../map-drawing.ts';
import type { GridProjection } from '../place/grid-projection.ts';
import { aimRequest } from './aim-request.ts';
import { FINGER_REACH, handleAt, MOUSE_REACH } from './handle-at.ts';
import { isByFinger, type DraftHost } from './mode.ts';

/** Each press sets a place; a press on a handle, such as the first corner, is told as that. */
export function installLineMode(
  map: MapLibreMap,
  projection: GridProjection,
  host: DraftHost,
): () => void {
  const canvas = map.getCanvas();

  function requestOf({ point, originalEvent }: MapMouseEvent): AimRequest | null {
    const reach = isByFinger(originalEvent) ? FINGER_REACH : MOUSE_REACH;
    return aimRequest(map, projection, point, reach, originalEvent.shiftKey, null);
  }
  function click(event: MapMouseEvent): void {
    const reach = isByFinger(event.originalEvent) ? FINGER_REACH : MOUSE_REACH;
    const handle = handleAt(map, projection, host.handles(), event.point, reach);
    const request = requestOf(event);
    if (handle !== null) host.press(handle);
    else if (request !== null) host.put(request);
  }
  function move(event: MapMouseEvent): void {
    host.show(map.isMoving() ? null : requestOf(event));
  }
  function leave(): void {
    host.show(null);
  }

  map.doubleClickZoom.disable();
  // Shift is for right angles here
  map.boxZoom.disable();
  canvas.style.cursor = 'crosshair';
  map.on('click', click);
  map.on('mousemove', move);
  map.on('mouseout', leave);
  return () => {
    map.off('click', click);
    map.off('mousemove', move);
    map.off('mouseout', leave);
    map.doubleClickZoom.enable();
    map.boxZoom.enable();
    canvas.style.cursor = '';
    host.show(null);
  };
}
