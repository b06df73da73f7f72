import { expect, test } from 'vitest';
import { answerBy } from '../../../server/commands/answer-by.ts';
import { dayIn } from '../../../server/days.ts';

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
