import type { Appointment, AppointmentState } from '../../../shared/schemas/appointments.ts';
import { calendarText, type CalendarEvent } from '../../documents/calendar.ts';
import type { FoundAppointment } from '../../models/appointments.ts';
import type { OutgoingMail } from '../outbox.ts';
import { momentInWords, nearDayInWords } from './day-in-words.ts';
import { ownerHomeUrl } from './owner-home-url.ts';

/** What has happened to an appointment. */
export type AppointmentNews = 'offered' | 'offered anew' | 'agreed' | 'asked for' | 'cancelled';

type Sender = {
  readonly schemeId: string;
  readonly publicUrl: string;
  readonly mailFrom: string;
  readonly now: Date;
  readonly timeZone: string;
};

const WORDS: Readonly<Record<Appointment['purpose'], { visit: string; why: string }>> = {
  'condition survey': {
    visit: 'visit to record the condition of your building',
    why: 'We look at the rooms and the outside with you and take photographs. If something changes later, you and we know what it was like before.',
  },
  access: {
    visit: 'visit to your building',
    why: 'We need to come in for a short time.',
  },
};

const SUBJECTS: Readonly<Record<AppointmentNews, string>> = {
  offered: 'May we visit',
  'offered anew': 'May we visit at another time',
  agreed: 'Our visit is agreed',
  'asked for': 'You asked for another day',
  cancelled: 'Our visit is called off',
};

const STATUSES: Readonly<Record<AppointmentState, CalendarEvent['status']>> = {
  offered: 'TENTATIVE',
  'another day asked for': 'TENTATIVE',
  agreed: 'CONFIRMED',
  done: 'CONFIRMED',
  cancelled: 'CANCELLED',
};

function placeOf({ building, place }: FoundAppointment): string {
  const { address, name, reference } = building;
  const at = address ?? name ?? reference;
  return place === at ? place : `${at}, ${place}`;
}

function whenAndWhere(appointment: FoundAppointment, timeZone: string) {
  const { startsAt, minutes } = appointment;
  return {
    list: [
      `When: ${momentInWords(startsAt, timeZone)}`,
      `For about ${minutes} minutes`,
      `Where: ${placeOf(appointment)}`,
    ],
  };
}

function bodyOf(
  news: AppointmentNews,
  appointment: FoundAppointment,
  { timeZone }: Sender,
): OutgoingMail['parts'] {
  const { visit, why } = WORDS[appointment.purpose];
  const facts = whenAndWhere(appointment, timeZone);
  const days = (appointment.askedFor?.days ?? []).map(
    ({ day, part }) => `${nearDayInWords(day)}, in the ${part}`,
  );
  switch (news) {
    case 'offered':
      return [`We would like to make a ${visit}.`, facts, why, 'Please tell us if this day suits you. If not, you can ask for another one.']; // prettier-ignore
    case 'offered anew':
      return [
        `We suggest another time for our ${visit}.`,
        facts,
        'Please tell us if it suits you.',
      ];
    case 'agreed':
      return ['Thank you. We will come as agreed.', facts, why];
    case 'asked for':
      return ['Thank you. You told us that one of these days is better for you:', { list: days }, 'We will write to you with a new time.']; // prettier-ignore
    case 'cancelled':
      return [`We have called off our ${visit}. You need not do anything.`, facts];
  }
}

/** An appointment as calendars take it in; the party is the one who attends. */
export function appointmentCalendar(
  appointment: FoundAppointment,
  sender: Omit<Sender, 'timeZone'>,
): string {
  const { id, version, state, startsAt, minutes, purpose, reader } = appointment;
  const { publicUrl, mailFrom, schemeId, now } = sender;
  const { visit, why } = WORDS[purpose];
  return calendarText({
    uid: `${id}@${new URL(publicUrl).hostname}`,
    sequence: version,
    status: STATUSES[state],
    stamp: now,
    start: startsAt,
    minutes,
    summary: `A ${visit}`,
    description: `${why}\n${ownerHomeUrl(publicUrl, schemeId)}`,
    location: placeOf(appointment),
    organizer: mailFrom,
    attendee: reader?.email ?? mailFrom,
  });
}

/** Tells a party of an appointment, with what their calendar needs; nothing where mail does not reach them. */
export function appointmentMails(
  news: AppointmentNews,
  appointment: FoundAppointment,
  sender: Sender,
): OutgoingMail[] {
  const { reader } = appointment;
  if (reader === null) return [];
  const url = ownerHomeUrl(sender.publicUrl, sender.schemeId);
  return [
    {
      ...{ schemeId: sender.schemeId, partyId: appointment.party.id, recipient: reader.email },
      subject: SUBJECTS[news],
      parts: [
        `${reader.name},`,
        ...bodyOf(news, appointment, sender),
        { label: 'Open your page', url },
      ],
      ...(news !== 'asked for' && { calendar: appointmentCalendar(appointment, sender) }),
    },
  ];
}
