import { union, type Geom } from 'polyclip-ts';
import { closedGaps, MOST_GAP } from '../../../../shared/building/closed-gaps.ts';
import { boundingBox, boxDistance } from '../../../../shared/geometry/bounding-box.ts';
import { partsOf, type Parts } from './draft.ts';

function geometry(parts: Parts): Geom {
  return parts.map((part) => part.map((ring) => ring.map(([x, y]): [number, number] => [x, y])));
}

/** Two as one, gaps between their walls closed; null where they do not touch. */
function joined(a: Parts, b: Parts): Parts | null {
  if (boxDistance(boundingBox(a.flat(2)), boundingBox(b.flat(2))) > MOST_GAP) return null;
  const [first, second] = closedGaps(a, b);
  const united = partsOf(union(geometry(first), geometry(second)));
  return united.length < a.length + b.length ? united : null;
}

/** All as one, each as soon as it touches what is joined by then; null where some never do. */
function allJoined(first: Parts, others: readonly Parts[]): Parts | null {
  let [one, left] = [first, others];
  while (left.length > 0) {
    const apart: Parts[] = [];
    for (const other of left) {
      const united = joined(one, other);
      if (united === null) apart.push(other);
      else one = united;
    }
    if (apart.length === left.length) return null;
    left = apart;
  }
  return one;
}

/**
 * What several buildings make together; null where they do not all touch. For looking at: the server joins
 * for good, in the same order and with the same gaps closed.
 */
export function joinPreview(buildings: readonly Parts[]): Parts | null {
  const [first, ...others] = buildings;
  if (first === undefined || others.length === 0) return null;
  try {
    return allJoined(first, others);
  } catch {
    return null;
  }
}
