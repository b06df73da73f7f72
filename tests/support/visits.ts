import { randomUUID } from 'node:crypto';
import type { NewVisit } from '../../shared/schemas/visits.ts';

/** A visit from outside on which a crack was seen, without photographs. */
export function aNewVisit(overrides: Partial<NewVisit> = {}): NewVisit {
  return {
    id: randomUUID(),
    visitedAt: '2026-12-02T00:30:00+11:00',
    part: 'outside',
    condition: 'fair',
    construction: null,
    notes: 'Seen from the street.\nNobody was in.',
    defects: [{ place: 'Gable, first floor', kind: 'crack', width: 0.4, note: 'stepped' }],
    photographs: [],
    changes: null,
    ...overrides,
  };
}

/** A photograph that a visit tells of, taken with no place kept. */
export function anAnnounced(overrides: Partial<NewVisit['photographs'][number]> = {}) {
  return {
    id: randomUUID(),
    caption: 'The gable',
    takenAt: '2026-12-02T00:31:00+11:00',
    width: 3,
    height: 2,
    keepsPlace: false,
    place: null,
    ...overrides,
  };
}
