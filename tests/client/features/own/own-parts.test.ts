import { describe, expect, test } from 'vitest';
import type { OwnAppointment } from '../../../../shared/schemas/appointments.ts';
import type { OwnLetter } from '../../../../shared/schemas/own.ts';
import { boundsRound } from '../../../../src/features/own/map/own-frame.ts';
import { nameSpot } from '../../../../src/features/own/map/name-spot.ts';
import { nextStep } from '../../../../src/features/own/next-step.ts';
import { givenDays, tomorrow } from '../../../../src/features/own/survey-days.ts';
import { timelineOf } from '../../../../src/features/own/timeline-of.ts';
import { anId } from '../../../support/answers.ts';

const NOW = new Date(2027, 4, 10, 12);

function aLetter(acknowledgedAt: string | null): OwnLetter {
  return {
    ...{ id: anId(1), subject: 'A letter', sentAt: '2027-05-01T09:00:00.000Z', buildings: [7] },
    ...{ answerBy: '2027-05-20', acknowledgedAt },
  };
}

function aVisit(state: OwnAppointment['state'], startsAt: string): OwnAppointment {
  return {
    ...{ id: anId(2), purpose: 'condition survey', startsAt, minutes: 60, place: 'Here', state },
    building: { id: 7, reference: 'B', name: null, address: null },
    ...{ askedFor: null, version: 1, changedAt: startsAt },
  };
}

const READ = aLetter('2027-05-05T09:00:00.000Z');
const LATER = '2027-06-09T10:00:00.000Z';
const EARLIER = '2027-05-02T10:00:00.000Z';

describe('the one thing to do', () => {
  test.each([
    ['a letter comes first', [aLetter(null)], [aVisit('offered', LATER)], 'read a letter'],
    ['then a day', [READ], [aVisit('offered', LATER)], 'choose a day'],
    ['one that has passed is not chosen', [READ], [aVisit('offered', EARLIER)], 'nothing'],
    ['days that were asked for wait', [READ], [aVisit('another day asked for', EARLIER)], 'days are with us'], // prettier-ignore
    ['a visit is looked forward to', [READ], [aVisit('agreed', LATER)], 'we come'],
    ['one that was called off is not', [READ], [aVisit('cancelled', LATER)], 'nothing'],
  ] as const)('%s', (_, letters, visits, kind) => {
    expect(nextStep(letters, visits, NOW).kind).toBe(kind);
  });
});

test('the timeline is in order, and only the first that is to come is next', () => {
  const visits = [aVisit('agreed', '2027-07-01T10:00:00.000Z'), aVisit('agreed', LATER)];
  const gone = [aVisit('done', EARLIER), aVisit('cancelled', LATER)];
  const milestones = [{ when: 'Spring 2028', title: 'We visit again', words: '' }];
  const steps = timelineOf([READ], [...visits, ...gone], milestones, { now: NOW, zone: 'UTC' });
  expect(steps.map(({ title, state }) => [title, state])).toEqual([
    ['We wrote to you', 'done'],
    ['A surveyor visited you', 'done'],
    ['A surveyor visits you', 'now'],
    ['A surveyor visits you', 'next'],
    ['We visit again', 'next'],
  ]);
  expect(steps[0]?.words).toBe('You confirmed on 5 May 2027.');
});

test('days are after today, and none is told twice', () => {
  const day = (given: string) => ({ day: given, part: 'morning' }) as const;
  expect(tomorrow(NOW)).toBe('2027-05-11');
  expect(givenDays([day(''), day('2027-05-11')], NOW)).toEqual({
    days: [day('2027-05-11')],
    fault: null,
  });
  for (const drafts of [[day('')], [day('2027-05-10')], [day('2027-06-01'), day('2027-06-01')]]) {
    expect(givenDays(drafts, NOW).fault).not.toBeNull();
  }
});

test('the map is round the building, and reaches to a tunnel beside it', () => {
  const outline: [number, number][][][] = [[[[1.64, 54.75], [1.6401, 54.75], [1.6401, 54.7501]]]]; // prettier-ignore
  const size = { width: 452, height: 253 };
  const near = boundsRound({ outline, figures: null }, size);
  expect((near[3] - near[1]) * 111_320).toBeCloseTo(253 / 2.6, 1);
  expect((near[0] + near[2]) / 2).toBeCloseTo(1.64005, 6);
  const figures = {
    ...{ settlement: null, most: 0.001, categoryLow: null, category: null, categoryHigh: null },
    ...{ tunnels: 1, depth: 20, distance: 80, diameter: 6, lines: [] },
  };
  const far = boundsRound({ outline, figures }, size);
  expect(((far[3] - far[1]) / 2) * 111_320).toBeGreaterThan(86);
});

test('the name of a line stands on it, clear of the building, and can be read', () => {
  const size = { width: 450, height: 250 };
  const spot = nameSpot([[[500, 20], [-50, 200]]], [225, 125], size); // prettier-ignore
  expect(spot?.x).toBeLessThan(140);
  expect(spot?.degrees).toBeCloseTo(-18.1, 1);
  expect(nameSpot([[[-200, 5], [700, 5]]], [225, 125], size)).toBeNull(); // prettier-ignore
});
