import { measureSchema, type Measure } from '../../shared/schemas/measures.ts';
import type { FoundMeasure } from '../models/measures.ts';

/** What leaves the server of a protective measure. */
export function presentMeasure(measure: FoundMeasure): Measure {
  return measureSchema.parse({
    id: measure.id,
    kind: measure.kind,
    title: measure.title,
    detail: measure.detail,
    state: measure.state,
    responsible: measure.responsible,
    due: measure.due,
    limit: measure.limit,
    buildings: measure.buildings,
    version: measure.version,
    createdBy: measure.createdBy,
    changedAt: measure.changedAt.toISOString(),
  });
}
