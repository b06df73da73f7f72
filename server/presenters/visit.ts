import type { z } from 'zod';
import type {
  photographFileSchema,
  VisitAnswer,
  VisitedBuilding,
} from '../../shared/schemas/visits.ts';
import type { FoundVisit, FoundVisitedBuilding } from '../models/find-visits.ts';
import type { VisitPhotographFile } from '../models/visit-photograph-file.ts';

/** What leaves the server of a visit. */
export function presentVisit(visit: FoundVisit): VisitAnswer {
  return {
    id: visit.id,
    buildingId: visit.buildingId,
    visitedAt: visit.visitedAt.toISOString(),
    recordedAt: visit.recordedAt.toISOString(),
    by: visit.by,
    part: visit.part,
    condition: visit.condition,
    construction: visit.construction,
    notes: visit.notes,
    defects: visit.defects.map(({ place, kind, width, note }) => ({ place, kind, width, note })),
    photographs: visit.photographs.map((photograph) => ({
      id: photograph.id,
      caption: photograph.caption,
      takenAt: photograph.takenAt,
      width: photograph.width,
      height: photograph.height,
      keepsPlace: photograph.keepsPlace,
      place: photograph.place,
      hasArrived: photograph.hasArrived,
    })),
  };
}

/** What leaves the server of a building that has been visited. */
export function presentVisitedBuilding(building: FoundVisitedBuilding): VisitedBuilding {
  return {
    buildingId: building.buildingId,
    reference: building.reference,
    name: building.name,
    address: building.address,
    visits: building.visits,
    visitedAt: building.visitedAt.toISOString(),
    by: building.by,
    part: building.part,
  };
}

/** What leaves the server of the file of a photograph. */
export function presentPhotographFile({
  photographId,
  type,
  bytes,
}: VisitPhotographFile): z.infer<typeof photographFileSchema> {
  return { id: photographId, type, bytes };
}
