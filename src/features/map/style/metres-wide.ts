import type { ExpressionSpecification } from 'maplibre-gl';

const EQUATOR = 40_075_016.686;
const TILE = 512;
const ZOOMS = [10, 24] as const;

/** How many pixels a metre takes at a zoom and latitude. */
export function pixelsPerMetre(zoom: number, latitude: number): number {
  return (TILE * 2 ** zoom) / (EQUATOR * Math.cos((latitude * Math.PI) / 180));
}

/** From which zoom on a metre takes so many pixels. */
export function zoomOfScale(pixels: number, latitude: number): number {
  return Math.log2((pixels * EQUATOR * Math.cos((latitude * Math.PI) / 180)) / TILE);
}

/** A width that is true to the ground at every zoom: metres, and pixels that are added to them. */
export function metresWide(
  metres: number | ExpressionSpecification,
  latitude: number,
  extraPixels = 0,
): ExpressionSpecification {
  function at(zoom: number): ExpressionSpecification {
    return ['+', extraPixels, ['*', metres, pixelsPerMetre(zoom, latitude)]];
  }
  const [far, near] = ZOOMS;
  return ['interpolate', ['exponential', 2], ['zoom'], far, at(far), near, at(near)];
}
