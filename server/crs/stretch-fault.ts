import proj4 from 'proj4';
import type { CrsAnswer } from '../../shared/schemas/crs.ts';

/** How far lengths may be off in the middle of a system's area, and anywhere in it. */
const MOST_IN_THE_MIDDLE = 0.01;
const MOST_ANYWHERE = 0.08;

/** WGS 84: its semi-major axis in metres and the square of its eccentricity. */
const AXIS = 6_378_137;
const ECCENTRICITY_SQUARED = 0.006_694_379_990_14;

/** A step of some metres, in degrees. */
const STEP = 1e-4;
/** Nearer to a pole, degrees of longitude are too short to measure by. */
const MOST_LATITUDE = 85;

type Point = readonly [longitude: number, latitude: number];

/** Metres on the ground of a step eastwards and of one northwards. */
function steps(latitude: number): [number, number] {
  const radians = Math.PI / 180;
  const sine = Math.sin(latitude * radians);
  const curved = 1 - ECCENTRICITY_SQUARED * sine * sine;
  const across = AXIS / Math.sqrt(curved);
  const along = (AXIS * (1 - ECCENTRICITY_SQUARED)) / curved ** 1.5;
  return [across * Math.cos(latitude * radians) * STEP * radians, along * STEP * radians];
}

/** A metre on the ground as the grid has it, eastwards and northwards. */
function scalesAt(forward: (point: [number, number]) => number[], [longitude, latitude]: Point) {
  const [east, north] = steps(latitude);
  const [x = NaN, y = NaN] = forward([longitude, latitude]);
  const [xEast = NaN, yEast = NaN] = forward([longitude + STEP, latitude]);
  const [xNorth = NaN, yNorth = NaN] = forward([longitude, latitude + STEP]);
  return [Math.hypot(xEast - x, yEast - y) / east, Math.hypot(xNorth - x, yNorth - y) / north];
}

function clamped(latitude: number): number {
  return Math.max(-MOST_LATITUDE, Math.min(MOST_LATITUDE, latitude));
}

/** The scale that is furthest from 1 at some points; those that the system cannot tell do not count. */
function worstScale(definition: string, points: readonly Point[]): number {
  const { forward } = proj4(definition);
  return points
    .flatMap((point) => scalesAt(forward, point))
    .filter((scale) => Number.isFinite(scale))
    .reduce((worst, scale) => (Math.abs(scale - 1) > Math.abs(worst - 1) ? scale : worst), 1);
}

/** Why walls drawn on a system would have the wrong length; undefined where they have the right one. */
export function stretchFault({ code, name, definition, bounds }: CrsAnswer): string | undefined {
  const [west, south, east, north] = bounds;
  const width = (east - west + 360) % 360 || 360;
  const longitudes = [0, 0.5, 1].map((share) => ((west + share * width + 540) % 360) - 180);
  const latitudes = [south, (south + north) / 2, north].map(clamped);
  const all = latitudes.flatMap((y) => longitudes.map((x): Point => [x, y]));
  const middle = worstScale(definition, all.slice(4, 5));
  const worst = worstScale(definition, all);
  const isTrue = Math.abs(middle - 1) <= MOST_IN_THE_MIDDLE && Math.abs(worst - 1) <= MOST_ANYWHERE;
  if (isTrue) return undefined;
  const drawn = Math.round(100 * worst).toLocaleString('en-GB');
  return `Lengths on EPSG:${code} (${name}) are not those on the ground: 100 m can be ${drawn} m. Choose a national grid or a UTM zone.`;
}
