import type { LngLatBoundsLike, Map as MapLibreMap } from 'maplibre-gl';

/** West, south, east and north; west is greater than east over the date line. */
export type CameraBounds = readonly [number, number, number, number];

const NEAREST_FIT = 18;
/** From here on a building can be made out. */
const CLEAR_ZOOM = 16;
const CLOSE_ZOOM = 17.5;
const AT_ONCE = { animate: false } as const;

function cornersOf([west, south, east, north]: CameraBounds): LngLatBoundsLike {
  return [
    [west, south],
    [east < west ? east + 360 : east, north],
  ];
}

/** Shows all of a piece of ground. */
export function fitBounds(map: MapLibreMap, bounds: CameraBounds): void {
  map.fitBounds(cornersOf(bounds), { ...AT_ONCE, padding: 24, maxZoom: NEAREST_FIT });
}

export function zoomBy(map: MapLibreMap, steps: number): void {
  map.zoomTo(map.getZoom() + steps, AT_ONCE);
}

export function panBy(map: MapLibreMap, x: number, y: number): void {
  map.panBy([x, y], AT_ONCE);
}

/** Goes to a building unless all of it can be made out where the map is. */
export function bringIntoView(map: MapLibreMap, [west, south, east, north]: CameraBounds): void {
  const view = map.getBounds();
  const isSeen = view.contains([west, south]) && view.contains([east, north]);
  if (isSeen && map.getZoom() >= CLEAR_ZOOM) return;
  map.jumpTo({
    center: [(west + east) / 2, (south + north) / 2],
    zoom: Math.max(map.getZoom(), CLOSE_ZOOM),
  });
}

/** The piece of ground that is seen, to about a metre. */
export function viewOf(map: MapLibreMap): CameraBounds {
  const view = map.getBounds();
  const [west, south, east, north] = [
    view.getWest(),
    view.getSouth(),
    view.getEast(),
    view.getNorth(),
  ].map((degrees) => Number(degrees.toFixed(5)));
  return [west ?? 0, south ?? 0, east ?? 0, north ?? 0];
}
