import proj4 from 'proj4';
import { findCrs } from '../crs/find-crs.ts';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { AppError } from '../errors.ts';
import type { Source } from './source.ts';

type Point = readonly [number, number];

/** From a file's grid to longitude and latitude. */
export type Place = (point: Point) => Point;

/** In degrees, and alike to a metre. */
const DEGREES = [4326, 4258];

function unknown(said: string): AppError {
  return new AppError('unreadable', `The grid "${said}" is not known here.`);
}

/** How a background is laid on the map, which has to be said in the file. */
export async function placeOfCrs({ crs, notes }: Source): Promise<Place> {
  if (crs === null) {
    throw new AppError('unreadable', notes[0] ?? 'The file does not say which grid it is in.');
  }
  const { code, wkt, said } = crs;
  if (code !== undefined && DEGREES.includes(code)) return (point) => point;
  if (code !== undefined) {
    const system = await findCrs(code);
    if (system === undefined) throw unknown(said);
    if ('fault' in system) throw new AppError('unreadable', system.fault);
    return toLonLat(system.crs.definition);
  }
  if (wkt === undefined) throw unknown(said);
  try {
    proj4(wkt);
    return toLonLat(wkt);
  } catch {
    throw unknown(said);
  }
}
