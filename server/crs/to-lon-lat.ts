import proj4 from 'proj4';

type Point = readonly [number, number];

/** A millimetre; more figures would only lengthen what is kept and sent. */
const DECIMALS = 1e8;

function rounded(value: number): number {
  return Math.round(value * DECIMALS) / DECIMALS;
}

/**
 * Turns points of a system, by its proj4 definition or description, into longitude and latitude in
 * degrees. A point outside of what the system can tell becomes NaN.
 */
export function toLonLat(definition: string): (point: Point) => [number, number] {
  const { inverse } = proj4(definition);
  return ([x, y]) => {
    if (!Number.isFinite(x) || !Number.isFinite(y)) return [NaN, NaN];
    const [longitude, latitude] = inverse([x, y]);
    return [rounded(longitude), rounded(latitude)];
  };
}
