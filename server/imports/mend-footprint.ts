import * as polyclip from 'polyclip-ts';
import { footprintArea } from '../../shared/building/footprint-area.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { cleanRings } from './clean-rings.ts';
import { crossingOfFootprint } from './crossing-of-footprint.ts';

/** Slivers that a crossing leaves, in square metres. */
const LEAST_PART = 0.01;

type Mutable = [number, number][][][];

function mutable(parts: FootprintRings): Mutable {
  return parts.map((part) => part.map((ring) => ring.map(([x, y]): [number, number] => [x, y])));
}

/**
 * A footprint whose rings cross, cut at the crossings: what lies inside an odd number of times is inside,
 * parts that overlap become one. Undefined where nothing sound comes of it.
 */
export function mendFootprint(parts: FootprintRings): FootprintRings | undefined {
  try {
    const united = cleanRings(polyclip.union(mutable(parts)));
    const sound = united?.filter((part) => footprintArea([part]) >= LEAST_PART);
    if (sound === undefined || sound.length === 0) return undefined;
    return crossingOfFootprint(sound) === undefined ? sound : undefined;
  } catch {
    // it gives up on what it cannot put in order
    return undefined;
  }
}
