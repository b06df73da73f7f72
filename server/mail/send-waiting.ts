import type { Transaction } from 'sequelize';
import { linkAddress } from '../authentication/link-token.ts';
import { letterPdf } from '../documents/letter/letter-pdf.ts';
import {
  endMail,
  insertAnswer,
  insertTry,
  lockWaitingMail,
  putOffMail,
  type ServerAnswer,
  type WaitingMail,
} from '../models/outbox-mails.ts';
import type { Services } from '../services.ts';
import type { Attachment } from './mailer.ts';
import { LINK_LEFT_OPEN, renderLetter, type LetterPart } from './render-letter.ts';

/** What mails are sent with. */
export type Sending = Pick<Services, 'database' | 'mailer' | 'env' | 'logger' | 'runs'>;

const MINUTE = 60_000;
/** After each refusal the next try is put off so long; after the last one it is given up. */
const WAITS = [1, 2, 5, 15, 60, 240, 720].map((minutes) => minutes * MINUTE);

/** What is said of a letter that was not sent since nothing could be done with it. */
const POINTLESS = 'Its link ended before it was sent.';

type Again = { readonly schemeId: string | null; readonly nextTryAt: Date };

type Outcome =
  | { readonly kind: 'accepted' | 'refused for now' | 'refused for good'; readonly words: string }
  /** The server may have it: it was spoken to, and no answer came. */
  | { readonly kind: 'no answer'; readonly words: string };

function field(error: unknown, name: string): unknown {
  return typeof error === 'object' && error !== null ? Reflect.get(error, name) : undefined;
}

/** What an error says of whether the server has the mail. */
function outcomeOf(error: unknown): Outcome {
  const words = String(field(error, 'response') ?? field(error, 'message') ?? error);
  const code = field(error, 'responseCode');
  if (typeof code === 'number') {
    return { kind: code >= 500 ? 'refused for good' : 'refused for now', words };
  }
  const wasNeverReached = field(error, 'syscall') === 'connect' || field(error, 'code') === 'EDNS';
  return { kind: wasNeverReached ? 'refused for now' : 'no answer', words };
}

function withLink({ env }: Sending, { linkId, parts }: WaitingMail): readonly LetterPart[] {
  if (linkId === null) return parts;
  const { url } = linkAddress(env, linkId);
  return parts.map((part) =>
    typeof part === 'object' && 'url' in part && part.url === LINK_LEFT_OPEN
      ? { ...part, url }
      : part,
  );
}

async function attachmentsOf(tools: Sending, mail: WaitingMail): Promise<Attachment[]> {
  const { schemeId, letterId, isReminder, calendar } = mail;
  const attachments: Attachment[] = [];
  if (schemeId !== null && letterId !== null && !isReminder) {
    const content = Buffer.from(await letterPdf(tools, { schemeId, letterId }));
    attachments.push({ filename: 'letter.pdf', contentType: 'application/pdf', content });
  }
  if (calendar !== null) {
    const method = /^METHOD:(\w+)\r?$/m.exec(calendar)?.[1] ?? 'REQUEST';
    const contentType = `text/calendar; charset=utf-8; method=${method}`;
    attachments.push({ filename: 'appointment.ics', contentType, content: calendar });
  }
  return attachments;
}

async function handOver(tools: Sending, mail: WaitingMail): Promise<Outcome> {
  const { id, recipient: to, subject } = mail;
  const letter = renderLetter({ id, to, subject }, withLink(tools, mail));
  const attachments = await attachmentsOf(tools, mail);
  await insertTry(tools.database, id, mail.tries + 1);
  try {
    return { kind: 'accepted', words: await tools.mailer.send({ ...letter, attachments }) };
  } catch (error) {
    tools.logger.warn({ err: error, mail: id }, 'a mail was not taken over');
    return outcomeOf(error);
  }
}

async function writeDown(
  { database }: Sending,
  mail: WaitingMail,
  outcome: Outcome,
  transaction: Transaction,
): Promise<Date | null> {
  const { id, refusals, tries, unanswered } = mail;
  const { kind, words } = outcome;
  if (kind !== 'no answer') {
    const answer: ServerAnswer = { wasAccepted: kind === 'accepted', words };
    await insertAnswer(database, { id, number: tries + 1 }, answer, transaction);
  }
  const wasSentAgain = unanswered > 0;
  if (kind === 'accepted') {
    await endMail(database, id, { state: 'sent', wasSentAgain, words }, transaction);
    return null;
  }
  const wait = kind === 'refused for good' ? undefined : WAITS[refusals];
  if (wait === undefined) {
    await endMail(database, id, { state: 'failed', wasSentAgain, words }, transaction);
    return null;
  }
  const until = new Date(Date.now() + wait);
  await putOffMail(database, id, { until, words }, transaction);
  return until;
}

/**
 * Sends a mail that waits, once whoever else has it in hand is done with it. That it is tried is written
 * down for good before the server is spoken to; a try without an answer may be with the server already, so
 * the mail goes again under its own Message-ID only, and the record says so. Gives when to try again.
 */
export function sendWaiting(tools: Sending, id: string): Promise<Again | null> {
  const { database } = tools;
  return database.transaction(async (transaction) => {
    const mail = await lockWaitingMail(database, id, transaction);
    if (mail?.isPointless === true) {
      const end = { state: 'failed', wasSentAgain: false, words: POINTLESS } as const;
      await endMail(database, id, end, transaction);
      return null;
    }
    if (mail?.isDue !== true) return null;
    const { schemeId } = mail;
    const nextTryAt = await writeDown(tools, mail, await handOver(tools, mail), transaction);
    return nextTryAt && { schemeId, nextTryAt };
  });
}
