import type { Map as MapLibreMap } from 'maplibre-gl';
import type { Handle } from '../map-drawing.ts';
import type { GridProjection } from '../place/grid-projection.ts';

/** How far beside a handle the pointer may come down, in pixels. */
export const MOUSE_REACH = 9;
export const FINGER_REACH = 22;

type Pixel = { readonly x: number; readonly y: number };

/** The handle nearest to a point of the screen; a corner goes before a middle. */
export function handleAt(
  map: MapLibreMap,
  projection: GridProjection,
  handles: readonly Handle[],
  { x, y }: Pixel,
  reach: number,
): Handle | null {
  let [nearest, least]: [Handle | null, number] = [null, reach];
  for (const handle of handles) {
    const lonLat = projection.toLonLat(handle.place);
    if (lonLat === null) continue;
    const pixel = map.project([lonLat[0], lonLat[1]]);
    // a middle gives way where corners are close
    const distance = Math.hypot(pixel.x - x, pixel.y - y) + (handle.kind === 'middle' ? 2 : 0);
    if (distance <= least) [nearest, least] = [handle, distance];
  }
  return nearest;
}
