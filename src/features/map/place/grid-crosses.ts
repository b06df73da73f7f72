import type { GridPlace, GridProjection } from './grid-projection.ts';
import { roundStep } from './round-step.ts';

/** West, south, east and north of what is in view, in the grid. */
export type GridBounds = readonly [number, number, number, number];

const MOST_SPACING_PIXELS = 280;
const ARM_PIXELS = 4.5;
const MOST_CROSSES = 400;
/** Further out a grid bends too much to be read off its crosses. */
const MOST_METRES_PER_PIXEL = 200;

function steps(from: number, to: number, step: number): number[] {
  const first = Math.ceil(from / step);
  const count = Math.max(0, Math.floor(to / step) - first + 1);
  return Array.from({ length: count }, (_, index) => (first + index) * step);
}

function arm(projection: GridProjection, from: GridPlace, to: GridPlace): GeoJSON.Position[][] {
  const [start, end] = [projection.toLonLat(from), projection.toLonLat(to)];
  return start === null || end === null ? [] : [[[...start], [...end]]];
}

/** Crosses where round eastings and northings meet, of the same size on the screen at every zoom. */
export function gridCrosses(
  projection: GridProjection,
  [west, south, east, north]: GridBounds,
  metresPerPixel: number,
): GeoJSON.FeatureCollection {
  const step = roundStep(MOST_SPACING_PIXELS * metresPerPixel);
  const [eastings, northings] = [steps(west, east, step), steps(south, north, step)];
  const reach = ARM_PIXELS * metresPerPixel;
  const places =
    metresPerPixel > MOST_METRES_PER_PIXEL || eastings.length * northings.length > MOST_CROSSES
      ? []
      : eastings.flatMap((e) => northings.map((n) => [e, n] as const));
  const coordinates = places.flatMap(([e, n]) => [
    ...arm(projection, [e - reach, n], [e + reach, n]),
    ...arm(projection, [e, n - reach], [e, n + reach]),
  ]);
  return {
    type: 'FeatureCollection',
    features: [
      { type: 'Feature', properties: {}, geometry: { type: 'MultiLineString', coordinates } },
    ],
  };
}
