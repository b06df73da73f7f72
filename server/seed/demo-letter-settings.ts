import type { Transaction } from 'sequelize';
import { defaultLetterSettings } from '../../shared/schemas/letter-settings.ts';
import { recordChange } from '../commands/record-change.ts';
import { insertSettings } from '../models/letter-settings.ts';
import type { Person } from '../models/person.ts';
import type { Scheme } from '../models/scheme.ts';
import { dayOf } from '../days.ts';

const MILESTONES = [
  {
    when: 'Spring 2027',
    title: 'Surveyors visit the homes near the line',
    words: 'They take a picture of every room, and you get a copy.',
  },
  {
    when: 'November 2027',
    title: 'The first tunnel passes',
    words: 'We measure the street twice a day.',
  },
  { when: 'December 2027', title: 'The second tunnel passes', words: 'We measure as before.' },
  {
    when: 'Spring 2028',
    title: 'We visit again',
    words: 'Any crack that is new is put right. You have two years to tell us.',
  },
];

const TERMS = {
  repairs: {
    words:
      'If the tunnel cracks your walls, we put it right. We pay for the work, and you choose when it is done.',
    source: 'Promise to owners of Port Dogger, version 2 (invented)',
  },
  timeZone: 'Europe/London',
  holidays: [
    { date: '2026-12-25', name: 'Christmas Day' },
    { date: '2026-12-28', name: 'Boxing Day, moved' },
    { date: '2027-01-01', name: 'New Year’s Day' },
    { date: '2027-03-26', name: 'Good Friday' },
    { date: '2027-03-29', name: 'Easter Monday' },
    { date: '2027-05-03', name: 'Early May holiday' },
    { date: '2027-05-31', name: 'Spring holiday' },
    { date: '2027-08-30', name: 'Summer holiday' },
    { date: '2027-12-27', name: 'Christmas Day, moved' },
    { date: '2027-12-28', name: 'Boxing Day, moved' },
  ],
};

/** What the letters of the demo go by: what every scheme starts with, whom to ask, and what happens when. */
export async function writeLetterSettings(
  scheme: Scheme,
  by: Person,
  transaction: Transaction,
): Promise<void> {
  const settings = defaultLetterSettings(dayOf(scheme.createdAt));
  const contact = {
    ...settings.contact,
    hours: 'Monday to Friday, 9:00 to 17:00',
    address: ['Harbour Crossing Office', '1 Custom House Quay', 'Port Dogger'],
  };
  const row = { schemeId: scheme.id, version: 1, by: by.id };
  const written = { ...settings, ...TERMS, contact, milestones: MILESTONES };
  await insertSettings(scheme.sequelize, row, written, transaction);
  const subject = { kind: 'letter settings', id: '1' };
  const change = { by: null, schemeId: scheme.id, action: 'change letter settings', subject };
  await recordChange({ ...change, after: { settings: written } }, transaction);
}
