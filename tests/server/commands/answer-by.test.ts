import { expect, test } from 'vitest';
import { answerBy, workingDaysAfter } from '../../../server/commands/answer-by.ts';
import { dayIn } from '../../../server/days.ts';

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

test('the day of a moment is that of the time zone, also where it is tomorrow already', () => {
  const late = new Date('2027-06-09T23:30:00Z');
  expect(dayIn(late, 'UTC')).toBe('2027-06-09');
  expect(dayIn(late, 'Europe/London')).toBe('2027-06-10');
  expect(dayIn(late, 'America/New_York')).toBe('2027-06-09');
});

test('answers are counted from the day where owners live, in the days that were promised', () => {
  const terms = {
    answerDays: { question: 5, concern: 1, claim: 10, correction: 10 },
    holidays: [{ date: '2027-06-11', name: 'Harbour day' }],
  };
  const late = new Date('2027-06-09T23:30:00Z');
  expect(answerBy('concern', late, { ...terms, timeZone: 'UTC' })).toBe('2027-06-10');
  expect(answerBy('concern', late, { ...terms, timeZone: 'Europe/London' })).toBe('2027-06-14');
  expect(answerBy('question', late, { ...terms, timeZone: 'UTC' })).toBe('2027-06-17');
});
