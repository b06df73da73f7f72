import type { Sequelize, Transaction } from 'sequelize';
import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import { dayIn } from '../days.ts';
import { AppError } from '../errors.ts';
import { appointmentMails, type AppointmentNews } from '../mail/letters/appointment-mails.ts';
import { findAppointments, type FoundAppointment } from '../models/appointments.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { freeDayWords } from '../working-days.ts';
import { recordChange } from './record-change.ts';

/** An appointment of a scheme; of another scheme, or of none of these parties, it is not there. */
export async function readAppointment(
  database: Sequelize,
  schemeId: string,
  which: { readonly id: string; readonly parties?: readonly string[] },
  transaction: Transaction | null = null,
): Promise<FoundAppointment> {
  const [found] = await findAppointments(database, schemeId, which, transaction);
  if (found === undefined) throw new AppError('not-found');
  return found;
}

/** An appointment that is not over, at the version that was seen. */
export function requireCurrent(appointment: FoundAppointment, version: number): void {
  const { state } = appointment;
  if (appointment.version !== version) throw new AppError('conflict');
  if (state === 'cancelled' || state === 'done') {
    throw new AppError('conflict', 'This appointment is over and stays as it is.');
  }
}

/** Refuses a time that has passed. */
export function requireToCome(startsAt: string): void {
  if (new Date(startsAt).getTime() > Date.now()) return;
  const message = 'This time has passed.';
  throw new AppError('invalid-input', undefined, [{ path: 'startsAt', message }]);
}

/** Refuses a weekend or a holiday, as the scheme's owners have it, unless it is said to be meant. */
export function requireWorkingDay(
  { startsAt, isFreeDayMeant }: { readonly startsAt: string; readonly isFreeDayMeant: boolean },
  { timeZone, holidays }: Pick<LetterSettings, 'timeZone' | 'holidays'>,
): void {
  const words = freeDayWords(dayIn(new Date(startsAt), timeZone), holidays);
  if (words === null || isFreeDayMeant) return;
  const message = `${words} Choose a working day, or say below that this day is meant.`;
  throw new AppError('invalid-input', undefined, [{ path: 'startsAt', message }]);
}

type Told = {
  readonly action: string;
  readonly before?: FoundAppointment;
  readonly after: FoundAppointment;
  /** What the party is told; nothing where it does not concern them. */
  readonly news: AppointmentNews | null;
  /** By whose clocks they are told. */
  readonly timeZone: string;
};

function toldOf({ building, party, purpose, startsAt, minutes, place, state }: FoundAppointment) {
  return { building: building.id, party: party.id, purpose, startsAt, minutes, place, state };
}

/** Tells the trail of an appointment, and the party by mail. */
export async function tellOfAppointment(
  { env, outbox }: Pick<Services, 'env' | 'outbox'>,
  by: Actor,
  scheme: Scheme,
  { action, before, after, news, timeZone }: Told,
  transaction: Transaction,
): Promise<void> {
  const change = {
    ...{ by, schemeId: scheme.id, action, subject: { kind: 'appointment', id: after.id } },
    ...(before !== undefined && { before: toldOf(before) }),
    after: toldOf(after),
  };
  await recordChange(change, transaction);
  if (news === null) return;
  const { PUBLIC_URL: publicUrl, MAIL_FROM: mailFrom } = env;
  const sender = { schemeId: scheme.id, publicUrl, mailFrom, timeZone, now: new Date() };
  await outbox.put(appointmentMails(news, after, sender), transaction);
}
