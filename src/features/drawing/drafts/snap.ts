import { nearestOnSegment } from '../../../../shared/geometry/nearest-on-segment.ts';
import { planDistance } from '../../../../shared/geometry/plan-distance.ts';
import { polygonEdges } from '../../../../shared/geometry/polygon-edges.ts';
import type { GridPlace } from '../../map/place/grid-projection.ts';
import type { Parts } from './draft.ts';

export type Snap = { readonly place: GridPlace; readonly to: 'corner' | 'edge' };

function nearest(
  place: GridPlace,
  candidates: readonly GridPlace[],
  reach: number,
): GridPlace | null {
  let [found, least]: [GridPlace | null, number] = [null, reach];
  for (const candidate of candidates) {
    const distance = planDistance(place, candidate);
    if (distance <= least) [found, least] = [candidate, distance];
  }
  return found;
}

/** The exact corner of a neighbour within reach, else the nearest place on one of their walls. */
export function snap(place: GridPlace, neighbours: readonly Parts[], reach: number): Snap | null {
  const rings = neighbours.flat(2);
  const corner = nearest(place, rings.flat(), reach);
  if (corner !== null) return { place: corner, to: 'corner' };
  const onEdges = rings
    .flatMap((ring) => polygonEdges(ring))
    .map(({ start, end }): GridPlace => {
      const { share } = nearestOnSegment(place, { start, end });
      return [start[0] + share * (end[0] - start[0]), start[1] + share * (end[1] - start[1])];
    });
  const edge = nearest(place, onEdges, reach);
  return edge === null ? null : { place: edge, to: 'edge' };
}
