import { describe, expect, test } from 'vitest';
import { acknowledgedMail } from '../../../../server/mail/letters/acknowledged.ts';
import {
  appointmentMails,
  type AppointmentNews,
} from '../../../../server/mail/letters/appointment-mails.ts';
import {
  matterAnsweredMail,
  matterReceivedMail,
} from '../../../../server/mail/letters/matter-mails.ts';
import { passwordResetMail } from '../../../../server/mail/letters/password-reset.ts';
import { reminderMail } from '../../../../server/mail/letters/reminder-mail.ts';
import type { OutgoingMail } from '../../../../server/mail/outbox.ts';
import { renderLetter } from '../../../../server/mail/render-letter.ts';
import type { FoundAppointment } from '../../../../server/models/appointments.ts';
import { anId } from '../../../support/answers.ts';
import { readingEase } from '../../../support/reading-ease.ts';

type Said = Pick<OutgoingMail, 'subject' | 'parts'>;

/** By Flesch's scale plain English; no mail to an owner may read harder. */
const PLAIN = 60;

const TO = { name: 'Ada Hopper', email: 'ada@example.org' };
const MATTER = {
  ...{ publicUrl: 'http://127.0.0.1:4600', schemeId: anId(10), partyId: anId(20), to: TO },
  title: 'Crack over the kitchen door',
};
const SENDER = {
  ...{ publicUrl: MATTER.publicUrl, schemeId: anId(10), mailFrom: 'office@example.org' },
  ...{ now: new Date('2027-05-10T09:00:00Z'), timeZone: 'Europe/London' },
};
const NEWS: readonly AppointmentNews[] = ['offered', 'offered anew', 'agreed', 'asked for', 'cancelled']; // prettier-ignore
const PURPOSES = ['condition survey', 'access'] as const;

function anAppointment(purpose: FoundAppointment['purpose']): FoundAppointment {
  return {
    ...{ id: anId(30), purpose, minutes: 60, place: 'At the front door', state: 'offered' },
    building: { id: 7, reference: 'B7', name: null, address: '9 Fishgate' },
    ...{ party: { id: anId(20), name: TO.name }, reader: TO, version: 1, createdBy: 'Bo' },
    startsAt: new Date('2027-06-09T09:00:00Z'),
    changedAt: SENDER.now,
    askedFor: {
      days: [
        { day: '2027-06-14', part: 'afternoon' },
        { day: '2027-06-15', part: 'morning' },
      ],
      note: '',
    },
  };
}

function appointmentMail(news: AppointmentNews, purpose: FoundAppointment['purpose']): Said {
  const [mail] = appointmentMails(news, anAppointment(purpose), SENDER);
  if (mail === undefined) throw new Error('Nothing is said.');
  return mail;
}

/** What is read of a mail, each line and each word to press a sentence of its own. */
function wordsOf({ subject, parts }: Said): string {
  const lines = parts.flatMap((part) => {
    if (typeof part === 'string') return [part];
    return 'list' in part ? part.list : [part.label];
  });
  return [subject, ...lines].map((line) => (/[.?!:]$/.test(line) ? line : `${line}.`)).join(' ');
}

const MAILS: readonly (readonly [string, Said])[] = [
  ['that a letter was read', acknowledgedMail(TO, { subject: 'A new tunnel near your home' }, '/')],
  ['that a message is here', matterReceivedMail({ ...MATTER, isConcern: false, due: '2027-05-13' })], // prettier-ignore
  ['that a worry is here', matterReceivedMail({ ...MATTER, isConcern: true, due: '2027-05-12' })],
  ['that an answer is late', matterReceivedMail({ ...MATTER, isConcern: true, due: null })],
  ['an answer', matterAnsweredMail({ ...MATTER, text: 'We will look at it on Monday.' })],
  ...NEWS.flatMap((news) =>
    PURPOSES.map((purpose) => [`${purpose}, ${news}`, appointmentMail(news, purpose)] as const),
  ),
  ['a new password', passwordResetMail(TO, { id: '1', until: SENDER.now })],
  [
    'a reminder',
    reminderMail({
      ...{ schemeId: anId(10), publicUrl: MATTER.publicUrl, contact: 'owners@example.org' },
      letter: { id: anId(40), ...TO, subject: 'A new tunnel near your home' },
    }),
  ],
];

describe('what owners are told by mail', () => {
  test.each(MAILS)('%s: is plain English', (name, mail) => {
    const ease = readingEase(wordsOf(mail));
    process.stdout.write(`Flesch ${ease.toFixed(0)}: the mail “${name}”\n`);
    expect(ease).toBeGreaterThanOrEqual(PLAIN);
  });
});

test('the measure takes in the whole mail, so that hard words anywhere in it are found', () => {
  const hard = 'Differential settlement necessitates considerable precautionary investigation.';
  const mail = matterAnsweredMail({ ...MATTER, text: `${hard}\n${hard}\n${hard}` });
  expect(readingEase(wordsOf(mail))).toBeLessThan(PLAIN);
  const { text } = renderLetter({ id: '1', to: TO.email, subject: mail.subject }, mail.parts);
  expect(text).toContain(hard);
});

test('an appointment is told by the clocks of the scheme, in summer too', () => {
  expect(wordsOf(appointmentMail('offered', 'access'))).toContain(
    'When: Wednesday 9 June 2027, 10:00.',
  );
  expect(wordsOf(appointmentMail('asked for', 'access'))).toContain('Monday 14 June, in the afternoon.'); // prettier-ignore
});
