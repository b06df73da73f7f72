import { fireEvent, screen, waitFor } from '@testing-library/react';
import { expect, test } from 'vitest';
import {
  defaultLetterSettings,
  newLetterSettingsSchema,
  type HeldLetterSettings,
} from '../../../../shared/schemas/letter-settings.ts';
import {
  faultOfHolidays,
  holidaysOfLines,
} from '../../../../src/features/letters/holiday-lines.ts';
import { LetterSettingsPage } from '../../../../src/features/letters/letter-settings-page.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const SETTINGS = `/api/schemes/${anId(10)}/letter-settings`;

function held(some: Partial<HeldLetterSettings['settings']> = {}): HeldLetterSettings {
  const settings = { ...defaultLetterSettings('2026-12-01'), ...some };
  return { version: 3, settings, by: 'Administrator', at: '2026-12-02T09:00:00.000Z' };
}

function show(settings: HeldLetterSettings) {
  const abilities = { readScheme: true, readLetters: true, updateLetterTemplates: true };
  const api = fakeApi({
    [`GET ${SETTINGS}`]: settings,
    [`POST ${SETTINGS}`]: settings,
    [`GET /api/schemes/${anId(10)}`]: aSchemeAnswer({ abilities }),
  });
  renderPage(
    <SchemeContext value={aSchemeAnswer({ abilities })}>
      <LetterSettingsPage />
    </SchemeContext>,
  );
  return api;
}

test('what owners are promised is read with its source, its zone and its holidays', async () => {
  const holidays = [{ date: '2027-05-03', name: 'May day' }];
  show(held({ holidays, timeZone: 'Europe/London' }));
  await screen.findByText('Tell us about any crack. We will come and look.');
  screen.getByText('no promise yet');
  screen.getByText('Europe/London');
  screen.getByText('3 May 2027, May day');
  screen.getByText(/Worries within 2, questions within 5/);
});

test('it is written anew: a promise, days, a zone and holidays one a line', async () => {
  const { calls } = show(held());
  fireEvent.click(await screen.findByRole('button', { name: 'Change this' }));
  const fill = (label: RegExp | string, value: string) => {
    fireEvent.change(screen.getByLabelText(label), { target: { value } });
  };
  fill(/On repairs, and who pays/, 'We mend what cracks.');
  fill('Source of this promise', 'The promise of 2026');
  fill(/Worries answered within/, '1');
  fill(/Time zone/, 'Europe/Atlantis');
  fill(/Public holidays/, '2027-05-31 Spring holiday\nMay day\n');
  expect(await axeFaults(document.body)).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'Keep as version 4' }));
  await screen.findByText('Write the name of a time zone, as Europe/London.');
  screen.getByText('“May day”: Write a day as 2027-05-03.');
  fill(/Time zone/, 'Europe/London');
  fill(/Public holidays/, '2027-05-31 Spring holiday\n\n 2027-05-03  May day ');
  fireEvent.click(screen.getByRole('button', { name: 'Keep as version 4' }));
  const sent = await waitFor(() => {
    const post = calls.find(({ route }) => route === `POST ${SETTINGS}`);
    expect(post).toBeDefined();
    return newLetterSettingsSchema.parse(post?.body);
  });
  expect(sent).toMatchObject({
    basedOn: 3,
    settings: {
      repairs: { words: 'We mend what cracks.', source: 'The promise of 2026' },
      answerDays: { question: 5, concern: 1, claim: 10, correction: 10 },
      timeZone: 'Europe/London',
      holidays: [
        { date: '2027-05-03', name: 'May day' },
        { date: '2027-05-31', name: 'Spring holiday' },
      ],
    },
  });
});

test('a line without a name is told by its words, and too many lines by none', () => {
  const holidays = holidaysOfLines('2027-05-31 Spring\n2027-05-03');
  expect(holidays[0]).toEqual({ date: '2027-05-03', name: '' });
  const issue = { path: ['holidays', 0, 'name'], message: 'Name the holiday.' };
  expect(faultOfHolidays(holidays, issue)).toBe('“2027-05-03”: Name the holiday.');
  const many = { path: ['holidays'], message: 'At most 200 holidays.' };
  expect(faultOfHolidays(holidays, many)).toBe('At most 200 holidays.');
  expect(holidaysOfLines(' \n')).toEqual([]);
});
