import proj4 from 'proj4';
import type { FileCrs } from './file-crs.ts';

type Point = readonly [number, number];

/** A tenth of a millimetre; more figures would only lengthen what is kept. */
const DECIMALS = 1e4;

function rounded(value: number): number {
  return Math.round(value * DECIMALS) / DECIMALS;
}

/** Two systems on one datum need no shift, whatever their definitions say of it. */
function withoutShift(definition: string): string {
  return definition.replaceAll(/\+(towgs84|nadgrids)=("[^"]*"|\S+) ?/g, '');
}

/**
 * Turns points of a file's system into a scheme's grid: as they are where the systems are one. A point
 * that cannot be told becomes NaN.
 */
export function toGrid(
  file: Pick<FileCrs, 'code' | 'definition' | 'datum'>,
  scheme: Pick<FileCrs, 'code' | 'definition' | 'datum'>,
): (point: Point) => [number, number] {
  if (file.code === scheme.code) return ([x, y]) => [x, y];
  const isOneDatum = file.datum === scheme.datum;
  const defined = (one: typeof file) =>
    isOneDatum ? withoutShift(one.definition) : one.definition;
  const [from, to] = [defined(file), defined(scheme)];
  const { forward } = proj4(from, to);
  return ([x, y]) => {
    if (!Number.isFinite(x) || !Number.isFinite(y)) return [NaN, NaN];
    try {
      const [east, north] = forward([x, y]);
      return [rounded(east), rounded(north)];
    } catch {
      return [NaN, NaN];
    }
  };
}
