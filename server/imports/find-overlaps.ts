import Flatbush from 'flatbush';
import { boundingBox, type Box } from '../../shared/geometry/bounding-box.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { unpacked, type StoredFootprint } from './footprint-store.ts';
import { overlapArea, SHARED, type Outlined } from './overlap-area.ts';

/** How a row's footprint lies over another one. */
export type Overlap<Other> = { readonly row: number; readonly other: Other; readonly area: number };

/** The footprints of a file, to find those that lie over others. */
export type OverlapSearch = {
  /** Those that lie over earlier ones of the file, each with the other's row. */
  readonly within: () => Overlap<number>[];
  /** Those that lie over a footprint that is not of the file; `isOwn` leaves rows out. */
  readonly over: <Other>(
    footprint: FootprintRings,
    other: Other,
    isOwn: (row: number) => boolean,
  ) => Overlap<Other>[];
};

/** A file that is one heap of overlaps says so with fewer. */
export const MOST_OVERLAPS = 20_000;

function outlined(stored: StoredFootprint): Outlined {
  return { box: stored, rings: stored.rings.map((part) => part.map(unpacked)) };
}

function indexOf(all: readonly StoredFootprint[]): Flatbush | undefined {
  if (all.length === 0) return undefined;
  const index = new Flatbush(all.length);
  for (const { west, south, east, north } of all) index.add(west, south, east, north);
  index.finish();
  return index;
}

/** Makes the footprints of a file ready to be searched. */
export function createOverlapSearch(all: readonly StoredFootprint[]): OverlapSearch {
  const index = indexOf(all);

  function near({ west, south, east, north }: Box, isMeant?: (place: number) => boolean) {
    const places = index?.search(west + SHARED, south + SHARED, east - SHARED, north - SHARED, isMeant); // prettier-ignore
    return (places ?? []).sort((a, b) => a - b).flatMap((place) => all[place] ?? []);
  }
  return {
    within: () => {
      const found: Overlap<number>[] = [];
      for (const [at, one] of all.entries()) {
        const drawn = outlined(one);
        for (const other of near(one, (place) => place < at)) {
          const area = overlapArea(drawn, outlined(other));
          if (area > 0) found.push({ row: one.row, other: other.row, area });
          if (found.length === MOST_OVERLAPS) return found;
        }
      }
      return found;
    },
    over: (footprint, other, isOwn) => {
      const drawn = { box: boundingBox(footprint.flat(2)), rings: footprint };
      return near(drawn.box)
        .filter(({ row }) => !isOwn(row))
        .map((stored) => ({ row: stored.row, other, area: overlapArea(outlined(stored), drawn) }))
        .filter(({ area }) => area > 0);
    },
  };
}
