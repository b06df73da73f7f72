import type { CrsEntry } from './crs-entry.ts';

type Box = CrsEntry['bbox'];

/** Older systems are off by metres from what satellites tell, or by nobody knows how much. */
const MODERN_METRES = 2;
const WEIGHT_OF_OLD = 0.1;

/** How large a box is, in square degrees; one across the date line counts as small. */
export function sizeOfBox([north, west, south, east]: Box): number {
  return Math.max(0, north - south) * Math.max(0, east - west);
}

/**
 * How well a system serves a country, from 0 to 1: what their boxes have in common beside the sizes of
 * both, and far less where it is an old one. One for a whole continent serves no country well.
 */
export function countryShare({ bbox, accuracy }: CrsEntry, country: Box): number {
  const [north, west, south, east] = bbox;
  const common = sizeOfBox([
    Math.min(north, country[0]),
    Math.max(west, country[1]),
    Math.max(south, country[2]),
    Math.min(east, country[3]),
  ]);
  const isModern = accuracy !== null && accuracy <= MODERN_METRES;
  const both = Math.sqrt(sizeOfBox(bbox) * sizeOfBox(country));
  return both === 0 ? 0 : (common / both) * (isModern ? 1 : WEIGHT_OF_OLD);
}
