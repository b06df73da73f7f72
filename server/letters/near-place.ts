import type { z } from 'zod';
import { nearestOnSegment } from '../../shared/geometry/nearest-on-segment.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import { pointInPolygon } from '../../shared/geometry/point-in-polygon.ts';
import { polygonEdges } from '../../shared/geometry/polygon-edges.ts';
import type { nearPlaceSchema } from '../../shared/schemas/letter-settings.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

/** Whether any of a footprint is so near to a place. */
export function isNear(
  footprint: FootprintRings,
  { east, north, metres }: Omit<z.infer<typeof nearPlaceSchema>, 'name'>,
): boolean {
  const place: PlanPoint = [east, north];
  return footprint.some(
    (rings) =>
      pointInPolygon(place, rings) ||
      rings.some((ring) =>
        polygonEdges(ring).some((edge) => nearestOnSegment(place, edge).distance <= metres),
      ),
  );
}
