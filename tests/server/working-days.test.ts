import { expect, test } from 'vitest';
import { freeDayWords, workingDayFrom, workingDaysAfter } from '../../server/working-days.ts';

const EASTER = [{ date: '2027-03-26' }, { date: '2027-03-29' }];

test.each([
  ['2027-03-22', 3, '2027-03-25', 'within a week'],
  ['2027-03-24', 2, '2027-03-30', 'over two holidays and a weekend'],
  ['2027-03-27', 1, '2027-03-30', 'begun on a weekend'],
  ['2027-04-02', 1, '2027-04-05', 'over a weekend'],
])('%s and %i working days are %s: %s', (day, count, then) => {
  expect(workingDaysAfter(day, count, EASTER)).toBe(then);
});

test('a holiday that falls on a weekend is left out once', () => {
  expect(workingDaysAfter('2027-03-26', 1, [{ date: '2027-03-27' }])).toBe('2027-03-29');
});

test.each([
  ['2027-03-25', '2027-03-25', 'is one'],
  ['2027-03-26', '2027-03-30', 'a holiday, a weekend and another holiday'],
  ['2027-04-03', '2027-04-05', 'a weekend'],
])('the working day from %s on is %s: %s', (day, then) => {
  expect(workingDayFrom(day, EASTER)).toBe(then);
});

test.each([
  ['2027-03-25', null],
  ['2027-04-03', 'Saturday 3 April is no working day. The next working day is Monday 5 April.'],
  ['2027-04-04', 'Sunday 4 April is no working day. The next working day is Monday 5 April.'],
  [
    '2027-03-26',
    'Friday 26 March is a holiday, Good Friday. The next working day is Monday 29 March.',
  ],
])('of %s is said: %s', (day, words) => {
  expect(freeDayWords(day, [{ date: '2027-03-26', name: 'Good Friday' }])).toBe(words);
});
