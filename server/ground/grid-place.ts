import proj4 from 'proj4';
import { findCrs } from '../crs/find-crs.ts';
import { AppError } from '../errors.ts';

type Point = readonly [number, number];

/** Systems of longitude and latitude that differ by less than levels of ground can tell. */
const DEGREES: ReadonlySet<number> = new Set([4326, 4258, 4979]);

async function definitionOf(code: number): Promise<string> {
  if (DEGREES.has(code)) return 'EPSG:4326';
  const system = (await findCrs(code)) ?? { fault: `There is no system EPSG:${code}.` };
  if ('crs' in system) return system.crs.definition;
  throw new AppError('invalid-input', undefined, [{ path: 'crs', message: system.fault }]);
}

/** Turns points of one system, by its number, into those of another. */
export async function betweenGrids(from: number, to: number): Promise<(point: Point) => Point> {
  if (from === to) return (point) => point;
  const { forward } = proj4(await definitionOf(from), await definitionOf(to));
  return ([x, y]) => {
    if (!Number.isFinite(x) || !Number.isFinite(y)) return [NaN, NaN];
    const [east, north] = forward([x, y]);
    return [east, north];
  };
}
