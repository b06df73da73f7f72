import { afterEach, describe, expect, test, vi } from 'vitest';
import { newVisitSchema } from '../../../../shared/schemas/visits.ts';
import { clashOfVisit, settled } from '../../../../src/features/visits/draft/clash-of-visit.ts';
import {
  correctedOf,
  isBlank,
  momentHere,
  seenOf,
  sentOf,
  type KeptVisit,
} from '../../../../src/features/visits/draft/kept-visit.ts';
import { fittedSize } from '../../../../src/features/visits/photographs/fitted-size.ts';
import { visitFaults } from '../../../../src/features/visits/visit-faults.ts';
import { aBuildingAnswer } from '../../../support/answers.ts';
import { aKeptPhotograph, aKeptVisit } from '../../../support/kept-visits.ts';

const BUILDING = { condition: 'good', storeys: 2, eavesHeight: 6.2, version: 4 };

function written(texts: KeptVisit['findings']['texts'], more: Partial<KeptVisit> = {}): KeptVisit {
  const visit = aKeptVisit({ seen: seenOf(aBuildingAnswer(BUILDING)), ...more });
  return { ...visit, findings: { ...visit.findings, texts } };
}

describe('a visit as it is sent', () => {
  test('puts right what was written otherwise than the register has it, and nothing else', () => {
    const visit = written({ condition: 'poor', storeys: '2', eavesHeight: '6,5', foundation: ' ' });
    const sent = newVisitSchema.parse(sentOf(visit));
    expect(sent).toMatchObject({
      ...{ part: 'outside', condition: 'poor', construction: null },
      changes: { version: 4, values: { condition: 'poor', eavesHeight: 6.5 } },
    });
    expect(Object.keys(sent.changes?.values ?? {})).toHaveLength(2);
  });

  test('puts nothing right where the register was not seen or says the same', () => {
    expect(sentOf(written({ condition: 'poor' }, { seen: null }))).toMatchObject({ changes: null });
    expect(sentOf(written({ condition: 'good' }))).toMatchObject({ condition: 'good', changes: null }); // prettier-ignore
  });

  test('announces its photographs without what the phone knows of them', () => {
    const visit = written({}, { photographs: [aKeptPhotograph()] });
    expect(newVisitSchema.parse(sentOf(visit)).photographs).toHaveLength(1);
  });
});

test('what keeps a visit from being recorded is said in sentences', () => {
  const visit = written({ storeys: 'two' });
  const defect = { id: 'a', place: '', kind: 'crack', width: 'wide', note: '' } as const;
  const findings = { ...visit.findings, part: null, defects: [defect] };
  expect(visitFaults({ ...visit, findings })).toEqual([
    'Say whether you were inside or outside.',
    'Defect 1: Say where it is.',
    'Defect 1: Write a number.',
    'Storeys: Write a number.',
  ]);
  expect(visitFaults(visit)).toHaveLength(1);
  expect(visitFaults(written({}))).toEqual([]);
});

test('a visit of which nothing is written is blank', () => {
  const visit = aKeptVisit();
  expect(isBlank(visit)).toBe(false);
  expect(isBlank({ ...visit, findings: { ...visit.findings, part: null } })).toBe(true);
});

describe('somebody else changed the register meanwhile', () => {
  const visit = written({ condition: 'poor', storeys: '3', eavesHeight: '7' });
  const theirs = { ...BUILDING, condition: 'fair', eavesHeight: 7, version: 6 };
  const fresh = seenOf(aBuildingAnswer(theirs));

  test('theirs stands beside mine where both did', () => {
    expect(clashOfVisit(visit, fresh)).toEqual({
      both: [{ name: 'condition', mine: 'poor', theirs: 'fair' }],
      mineOnly: ['storeys'],
      theirsOnly: [],
    });
  });

  test('what was chosen goes on top of theirs, and what was found stays with the visit', () => {
    const kept = settled(visit, fresh, ['storeys']);
    expect(kept).toMatchObject({ state: 'kept', fault: null, findings: visit.findings });
    expect(correctedOf(kept)).toEqual([['storeys', 3]]);
    expect(sentOf(kept)).toMatchObject({ condition: 'poor', changes: { version: 6 } });
    expect(correctedOf(settled(visit, fresh, ['condition', 'storeys']))).toEqual([
      ['condition', 'poor'],
      ['storeys', 3],
    ]);
    expect(sentOf(settled(visit, null, []))).toMatchObject({ changes: null });
  });
});

describe('a moment', () => {
  afterEach(() => {
    vi.restoreAllMocks();
  });
  test.each([
    [0, '2026-12-02T23:30:05+00:00'],
    [-60, '2026-12-03T00:30:05+01:00'],
    [-630, '2026-12-03T10:00:05+10:30'],
    [210, '2026-12-02T20:00:05-03:30'],
  ])('keeps the day where the phone is, %i minutes west of Greenwich', (west, text) => {
    vi.spyOn(Date.prototype, 'getTimezoneOffset').mockReturnValue(west);
    expect(momentHere(new Date('2026-12-02T23:30:05.678Z'))).toBe(text);
  });
});

test.each([
  [4800, 3600, 2400, 1800],
  [3000, 4000, 1800, 2400],
  [640, 480, 640, 480],
  [100_000, 3, 2400, 1],
])('a photograph of %i by %i becomes %i by %i', (width, height, toWidth, toHeight) => {
  expect(fittedSize({ width, height }, 2400)).toEqual({ width: toWidth, height: toHeight });
});
