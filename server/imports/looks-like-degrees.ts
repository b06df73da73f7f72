import { boundingBox } from '../../shared/geometry/bounding-box.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

/** The largest building, in degrees, is far smaller. */
const LARGEST = 0.05;

/** Whether a footprint that is none in metres is written in longitude and latitude. */
export function looksLikeDegrees(geometry: FootprintRings): boolean {
  const { west, south, east, north } = boundingBox(geometry.flat(2));
  const isOnGlobe = west >= -180 && east <= 360 && south >= -180 && north <= 180;
  return isOnGlobe && east - west < LARGEST && north - south < LARGEST;
}
