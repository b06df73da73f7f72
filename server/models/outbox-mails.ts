import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { OutgoingMail } from '../mail/outbox.ts';
import type { LetterPart } from '../mail/render-letter.ts';

/** A mail that waits, as it is sent. */
export type WaitingMail = {
  readonly id: string;
  readonly schemeId: string | null;
  readonly letterId: string | null;
  readonly linkId: string | null;
  readonly recipient: string;
  readonly subject: string;
  readonly parts: readonly LetterPart[];
  readonly calendar: string | null;
  readonly isReminder: boolean;
  readonly refusals: number;
  readonly isDue: boolean;
  /** It is of an account, and its link can no longer be used. */
  readonly isPointless: boolean;
  /** How often it has been handed to the mail server. */
  readonly tries: number;
  /** How many of these had no answer that is known. */
  readonly unanswered: number;
};

const AT_ONCE = 500;

/** Puts mails in; gives their numbers in the order of the mails. */
export async function insertMails(
  database: Sequelize,
  mails: readonly (OutgoingMail & { readonly id: string })[],
  transaction: Transaction,
): Promise<void> {
  for (let from = 0; from < mails.length; from += AT_ONCE) {
    await database.query(
      `insert into outbox (id, scheme_id, letter_id, recipient, subject, parts, link_id, calendar, is_reminder,
         party_id)
       select id, "schemeId", "letterId", recipient, subject, parts, "linkId", calendar,
         coalesce("isReminder", false), "partyId"
       from jsonb_to_recordset($1::jsonb) as mail (id uuid, "schemeId" uuid, "letterId" uuid,
         recipient text, subject text, parts jsonb, "linkId" uuid, calendar text, "isReminder" boolean,
         "partyId" uuid)`,
      { bind: [JSON.stringify(mails.slice(from, from + AT_ONCE))], transaction },
    );
  }
}

/**
 * A mail that waits, kept from others until the transaction ends; undefined where it does not wait any more
 * or somebody else has it in hand. Others may refer to it meanwhile: tries are written beside this transaction.
 */
export async function lockWaitingMail(
  database: Sequelize,
  id: string,
  transaction: Transaction,
): Promise<WaitingMail | undefined> {
  const [mail] = await database.query<WaitingMail>(
    `select id, scheme_id as "schemeId", letter_id as "letterId", link_id as "linkId", recipient, subject, parts, calendar,
       is_reminder as "isReminder", refusals, next_try_at <= now() as "isDue",
       (scheme_id is null and not exists (
         select from single_use_links l
         where l.id = o.link_id and l.used_at is null and l.expires_at > now()
       )) as "isPointless",
       (select count(*)::integer from outbox_tries t where t.mail_id = o.id) as tries,
       (select count(*)::integer from outbox_tries t where t.mail_id = o.id and not exists (
         select from outbox_answers a where a.mail_id = t.mail_id and a.number = t.number
       )) as unanswered
     from outbox o where id = $1 and state = 'waiting' for no key update skip locked`,
    { type: QueryTypes.SELECT, bind: [id], transaction },
  );
  return mail;
}

/** Writes down, at once and for good, that a mail is about to be handed over. */
export async function insertTry(database: Sequelize, id: string, number: number): Promise<void> {
  await database.query('insert into outbox_tries (mail_id, number) values ($1, $2)', {
    bind: [id, number],
  });
}

export type ServerAnswer = { readonly wasAccepted: boolean; readonly words: string };

/** Writes down what the mail server said to a try. */
export async function insertAnswer(
  database: Sequelize,
  { id, number }: { readonly id: string; readonly number: number },
  { wasAccepted, words }: ServerAnswer,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    'insert into outbox_answers (mail_id, number, was_accepted, words) values ($1, $2, $3, $4)',
    { bind: [id, number, wasAccepted, words], transaction },
  );
}

/**
 * A mail that will not be handed over again: the server has it, or never will. What was said of an account,
 * and to whom, is then forgotten.
 */
export async function endMail(
  database: Sequelize,
  id: string,
  end: {
    readonly state: 'sent' | 'failed';
    readonly wasSentAgain: boolean;
    readonly words: string;
  },
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update outbox set state = $2, was_sent_again = $3, server_words = $4, ended_at = now(),
       recipient = case when scheme_id is null then '' else recipient end,
       parts = case when scheme_id is null then '[]' else parts end
     where id = $1`,
    { bind: [id, end.state, end.wasSentAgain, end.words], transaction },
  );
}

/** A mail that is tried again later. */
export async function putOffMail(
  database: Sequelize,
  id: string,
  { until, words }: { readonly until: Date; readonly words: string },
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update outbox set refusals = refusals + 1, next_try_at = $2, server_words = $3 where id = $1`,
    { bind: [id, until, words], transaction },
  );
}

/** Ends what waits to go to or for parties whose personal data are erased; gives how much that was. */
export async function endMailsOfParties(
  database: Sequelize,
  partyIds: readonly string[],
  transaction: Transaction,
): Promise<number> {
  const ended = await database.query(
    `update outbox set state = 'failed', ended_at = now(),
       server_words = 'Personal data were erased before it was sent.'
     where state = 'waiting' and (party_id = any($1::uuid[])
       or letter_id in (select id from letters where party_id = any($1::uuid[])))
     returning id`,
    { type: QueryTypes.SELECT, bind: [partyIds], transaction },
  );
  return ended.length;
}

type DueMail = Pick<WaitingMail, 'id' | 'schemeId'> & { readonly nextTryAt: Date };

/** What waits, with the time from which on it may be tried. */
export function findWaitingMails(database: Sequelize): Promise<DueMail[]> {
  return database.query<DueMail>(
    `select id, scheme_id as "schemeId", next_try_at as "nextTryAt" from outbox where state = 'waiting' order by put_in_at`,
    { type: QueryTypes.SELECT },
  );
}
