import { QueryTypes, type Transaction } from 'sequelize';
import { firstAdministratorMail } from '../mail/letters/first-administrator.ts';
import { findPersonByEmail } from '../models/find-person-by-email.ts';
import { Person } from '../models/person.ts';
import type { Services } from '../services.ts';
import { issueLink } from './issue-link.ts';
import { recordChange } from './record-change.ts';

/** Any number; who holds its lock looks for administrators, and makes the first. */
const LOCK = 20_260_103;

type Wanted = { readonly email: string; readonly name: string };

/** What came of it; the link stands in `url`, for whoever started the program to pass on. */
export type FirstAdministrator =
  | { readonly state: 'there' }
  /** There is none, and nobody was named. */
  | { readonly state: 'missing' }
  /** Invited before, and not in yet. */
  | { readonly state: 'awaited'; readonly email: string }
  /** Somebody who has a password was made administrator. */
  | { readonly state: 'promoted'; readonly email: string }
  | { readonly state: 'invited'; readonly email: string; readonly url: string };

async function createAdministrator(
  { email, name }: Wanted,
  transaction: Transaction,
): Promise<Person> {
  const after = { name, email, isAdministrator: true };
  const person = await Person.create(after, { transaction });
  const subject = { kind: 'person', id: person.id };
  await recordChange({ by: null, action: 'invite person', subject, after }, transaction);
  return person;
}

async function promote(person: Person, transaction: Transaction): Promise<void> {
  await person.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE });
  if (person.isAdministrator) return;
  await person.update({ isAdministrator: true }, { transaction });
  const subject = { kind: 'person', id: person.id };
  const [before, after] = [{ isAdministrator: false }, { isAdministrator: true }];
  await recordChange({ by: null, action: 'change person', subject, before, after }, transaction);
}

async function administratorOf(wanted: Wanted, transaction: Transaction): Promise<Person> {
  const known = await findPersonByEmail(wanted.email, transaction);
  if (known === null) return createAdministrator(wanted, transaction);
  await promote(known, transaction);
  return known;
}

/**
 * Asks the first administrator in while no administrator has a password. Asked again, they get a new link:
 * the old one may be lost.
 */
export function inviteFirstAdministrator(
  { env, database, outbox }: Services,
  wanted?: Wanted,
): Promise<FirstAdministrator> {
  return database.transaction(async (transaction) => {
    await database.query('select pg_advisory_xact_lock(:lock)', {
      replacements: { lock: LOCK },
      type: QueryTypes.SELECT,
      transaction,
    });
    const found = await Person.findAll({
      where: { isAdministrator: true },
      order: ['createdAt'],
      transaction,
    });
    if (found.some(({ passwordHash }) => passwordHash !== null)) return { state: 'there' };
    const [awaited] = found;
    if (wanted === undefined) {
      return awaited ? { state: 'awaited', email: awaited.email } : { state: 'missing' };
    }
    const person = await administratorOf(wanted, transaction);
    if (person.passwordHash !== null) return { state: 'promoted', email: person.email };
    const link = await issueLink(env, person.id, 'invitation', transaction);
    await outbox.put([firstAdministratorMail({ person, link })], transaction);
    return { state: 'invited', email: person.email, url: link.url };
  });
}
