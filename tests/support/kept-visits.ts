import { randomUUID } from 'node:crypto';
import { blankVisit, type KeptVisit } from '../../src/features/visits/draft/kept-visit.ts';
import type { VisitStore } from '../../src/features/visits/draft/visit-store.ts';
import { anId } from './answers.ts';

/** A store of visits in memory, and what is in it. */
export function visitStoreInMemory(...kept: readonly KeptVisit[]) {
  const visits = new Map(kept.map((visit) => [visit.id, visit]));
  const files = new Map<string, Blob>();
  for (const { photographs } of kept) {
    for (const { id } of photographs) files.set(id, new Blob([id]));
  }
  const store: VisitStore = {
    all: () => Promise.resolve([...visits.values()]),
    put: (visit) => {
      visits.set(visit.id, visit);
      return Promise.resolve();
    },
    remove: (visit) => {
      visits.delete(visit.id);
      for (const { id } of visit.photographs) files.delete(id);
      return Promise.resolve();
    },
    photograph: (id) => Promise.resolve(files.get(id)),
    putPhotograph: (id, file) => {
      files.set(id, file);
      return Promise.resolve();
    },
    removePhotograph: (id) => {
      files.delete(id);
      return Promise.resolve();
    },
  };
  return { store, visits, files };
}

/** A visit that was recorded on this phone and waits to be sent. */
export function aKeptVisit(overrides: Partial<KeptVisit> = {}): KeptVisit {
  const place = { personId: anId(), schemeId: anId(10), buildingId: 1, title: 'B0001 Mill' };
  const blank = blankVisit({ id: randomUUID(), ...place });
  return {
    ...blank,
    state: 'kept',
    visitedAt: '2026-12-02T09:00:00+01:00',
    findings: { ...blank.findings, part: 'outside' },
    ...overrides,
  };
}

/** A photograph of it that has not gone. */
export function aKeptPhotograph(): KeptVisit['photographs'][number] {
  return {
    ...{ id: randomUUID(), caption: '', takenAt: null, width: 3, height: 2 },
    ...{ keepsPlace: false, place: null, isSent: false },
  };
}
