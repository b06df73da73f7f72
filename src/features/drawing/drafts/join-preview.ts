import { union, type Geom } from 'polyclip-ts';
import { partsOf, type Parts } from './draft.ts';

function geometry(parts: Parts): Geom {
  return parts.map((part) => part.map((ring) => ring.map(([x, y]): [number, number] => [x, y])));
}

function united(first: Parts, ...others: readonly Parts[]): Parts {
  return partsOf(union(geometry(first), ...others.map(geometry)));
}

/** Whether one gets from the first to each of the others over those that touch. */
function hangTogether(first: Parts, others: readonly Parts[]): boolean {
  const reached = [first];
  let left = others;
  for (const from of reached) {
    const next = left.filter((one) => united(from, one).length < from.length + one.length);
    left = left.filter((one) => !next.includes(one));
    reached.push(...next);
  }
  return left.length === 0;
}

/**
 * What several buildings make together; null where they do not all touch. For looking at: the server joins
 * for good.
 */
export function joinPreview(buildings: readonly Parts[]): Parts | null {
  const [first, ...others] = buildings;
  if (first === undefined || others.length === 0) return null;
  try {
    return hangTogether(first, others) ? united(first, ...others) : null;
  } catch {
    return null;
  }
}
