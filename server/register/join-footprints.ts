import { union } from 'polyclip-ts';
import { closedGaps, MOST_GAP } from '../../shared/building/closed-gaps.ts';
import { boundingBox, boxDistance } from '../../shared/geometry/bounding-box.ts';
import { AppError } from '../errors.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { clipped } from './clipped.ts';

/** One footprint of two that share a stretch of a wall or some area; undefined where they do not. */
function joined(a: FootprintRings, b: FootprintRings): FootprintRings | undefined {
  if (boxDistance(boundingBox(a.flat(2)), boundingBox(b.flat(2))) > MOST_GAP) return undefined;
  const united = clipped(union, ...closedGaps(a, b));
  return united.length < a.length + b.length ? united : undefined;
}

/** One footprint of several, or a refusal where they do not touch. */
export function joinFootprints(footprints: readonly FootprintRings[]): FootprintRings {
  let [one = [], ...left] = footprints;
  while (left.length > 0) {
    const apart: FootprintRings[] = [];
    for (const other of left) {
      const united = joined(one, other);
      if (united === undefined) apart.push(other);
      else one = united;
    }
    if (apart.length === left.length) {
      const message =
        'They do not touch: only buildings that share a wall, or stand at most 5 cm apart, can be joined.';
      throw new AppError('invalid-input', message, [{ path: 'buildings', message }]);
    }
    left = apart;
  }
  return one;
}
