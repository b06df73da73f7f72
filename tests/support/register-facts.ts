import type { RegisterFacts } from '../../shared/assessment/prepared-building.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';

/** The closed ring of a rectangle along the grid. */
export function aRing(west: number, south: number, length: number, depth: number): PlanPoint[] {
  const [east, north] = [west + length, south + depth];
  return [[west, south], [east, south], [east, north], [west, north], [west, south]]; // prettier-ignore
}

/** A building of the register: unless said otherwise 10 by 8 m from (−5, 2) to (5, 10), all known. */
export function someFacts(overrides: Partial<RegisterFacts> = {}): RegisterFacts {
  return {
    id: '1',
    parts: [[aRing(-5, 2, 10, 8)]],
    storeys: 3,
    eavesHeight: 9,
    groundLevel: 0,
    foundingLevel: -1.5,
    eOverG: null,
    poisson: null,
    construction: 'masonry',
    foundation: 'strip',
    listedGrade: 'not listed',
    condition: 'fair',
    structureScore: null,
    featuresScore: null,
    ...overrides,
  };
}

/** A building of which nothing is known but where it stands. */
export function noFacts(overrides: Partial<RegisterFacts> = {}): RegisterFacts {
  return someFacts({
    ...{ storeys: null, eavesHeight: null, groundLevel: null, foundingLevel: null },
    ...{ construction: null, foundation: null, listedGrade: null, condition: null },
    ...overrides,
  });
}
