import type { CameraBounds } from '../map/camera.ts';

/** Across so many degrees of latitude footprints can still be made out; about six kilometres. */
const WIDE = 0.055;
/** Half of what is shown where rows are scattered wider than that; about a kilometre and a half. */
const AROUND = 0.0075;

type Place = readonly [longitude: number, latitude: number];

function middle(values: readonly number[]): number {
  return values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;
}

/**
 * What the map shows at first: all rows, or where they are scattered too wide to be made out, the middle of
 * those whose places are known; null while none is.
 */
export function homeOfRows(bounds: CameraBounds, places: readonly Place[]): CameraBounds | null {
  const [west, south, east, north] = bounds;
  const narrowing = Math.cos((((south + north) / 2) * Math.PI) / 180);
  if (Math.max((east - west) * narrowing, north - south) <= WIDE) return bounds;
  if (places.length === 0) return null;
  const longitude = middle(places.map(([x]) => x));
  const latitude = middle(places.map(([, y]) => y));
  const across = AROUND / narrowing;
  return [longitude - across, latitude - AROUND, longitude + across, latitude + AROUND];
}
