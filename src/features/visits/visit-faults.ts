import { BUILDING_FIELDS } from '../../../shared/schemas/building-fields.ts';
import { newVisitSchema, VISITED_FIELDS } from '../../../shared/schemas/visits.ts';
import { sentOf, type KeptVisit } from './draft/kept-visit.ts';

function placeWords(path: readonly PropertyKey[]): string {
  const [part, index, name] = path;
  if (part === 'defects' && typeof index === 'number') return `Defect ${index + 1}: `;
  if (part === 'photographs' && typeof index === 'number') return `Photograph ${index + 1}: `;
  const field = VISITED_FIELDS.find((one) => one === (part === 'changes' ? name : part));
  if (field !== undefined) return `${BUILDING_FIELDS[field].label}: `;
  return part === 'notes' ? 'Notes: ' : '';
}

/** What keeps a visit from being recorded, in sentences. */
export function visitFaults(visit: KeptVisit): string[] {
  const parsed = newVisitSchema.safeParse(sentOf(visit));
  if (parsed.success) return [];
  return parsed.error.issues.map(({ path, message }) =>
    path[0] === 'part'
      ? 'Say whether you were inside or outside.'
      : `${placeWords(path)}${message}`,
  );
}
