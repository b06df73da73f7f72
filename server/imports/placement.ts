import type { ImportOptions } from '../../shared/schemas/imports.ts';
import { findFileCrs, type FileCrs } from '../crs/file-crs.ts';
import { toGrid } from '../crs/to-grid.ts';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { withinBounds } from '../crs/within-bounds.ts';
import { AppError } from '../errors.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

type Point = readonly [number, number];

/** The way of a file's coordinates to a scheme's grid and to the map. */
export type Placement = {
  readonly file: FileCrs;
  readonly scheme: FileCrs;
  readonly toGrid: (point: Point) => [number, number];
  readonly toLonLat: (point: Point) => [number, number];
  /** Whether a place in degrees lies where both systems are used. */
  readonly isInArea: (lonLat: Point) => boolean;
};

/** Towns lie across the edges of zones; so far beside one, in degrees, its grid still serves. */
const MARGIN = 1;

async function usable(code: number): Promise<FileCrs> {
  const found = await findFileCrs(code);
  if (found !== undefined && 'crs' in found) return found.crs;
  const message = found?.fault ?? `There is no system EPSG:${code}.`;
  throw new AppError('invalid-input', undefined, [{ path: 'options.place.crs', message }]);
}

/** How a file in some system comes to a scheme's grid, its axes exchanged and shifted as wanted. */
export async function placementOf(
  place: Omit<ImportOptions['place'], 'crs'> & { readonly crs: number },
  schemeCrs: number,
): Promise<Placement> {
  const [file, scheme] = await Promise.all([usable(place.crs), usable(schemeCrs)]);
  const convert = toGrid(file, scheme);
  const [shiftEast, shiftNorth] = place.shift;
  const isShifted = shiftEast !== 0 || shiftNorth !== 0;
  return {
    file,
    scheme,
    toGrid: ([x, y]) => {
      const [east, north] = convert(place.exchangeAxes ? [y, x] : [x, y]);
      return isShifted ? [east + shiftEast, north + shiftNorth] : [east, north];
    },
    toLonLat: toLonLat(scheme.definition),
    isInArea: (lonLat) =>
      withinBounds(file.bounds, lonLat, MARGIN) && withinBounds(scheme.bounds, lonLat, MARGIN),
  };
}

/** A footprint with every corner moved. */
export function eachCorner(parts: FootprintRings, move: (point: Point) => Point): FootprintRings {
  return parts.map((part) => part.map((ring) => ring.map(move)));
}
