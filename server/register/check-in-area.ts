import { crsOfScheme } from '../crs/crs-of-scheme.ts';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { AppError } from '../errors.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { Scheme } from '../models/scheme.ts';

/** Areas of use are given to a hundredth of a degree or two. */
const MARGIN = 0.05;

/** Refuses a footprint that is not where the scheme's system is used, as when axes were exchanged. */
export async function checkInArea(scheme: Scheme, footprint: FootprintRings): Promise<void> {
  const { bounds, definition, name } = await crsOfScheme(scheme);
  const [west, south, east, north] = bounds;
  const place = toLonLat(definition);
  const width = (east - west + 360) % 360 || 360;
  const isInside = footprint.flat(2).every((point) => {
    const [longitude, latitude] = place(point);
    const beyond = (longitude - west + MARGIN + 720) % 360;
    return beyond <= width + 2 * MARGIN && latitude >= south - MARGIN && latitude <= north + MARGIN;
  });
  if (isInside) return;
  const message = `This is not where EPSG:${scheme.crs} (${name}) is used. Check eastings and northings.`;
  throw new AppError('invalid-input', message, [{ path: 'footprint', message }]);
}
