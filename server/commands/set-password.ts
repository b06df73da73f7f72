import type { Transaction } from 'sequelize';
import type { Person } from '../models/person.ts';
import { endLinks } from './end-links.ts';
import { recordChange } from './record-change.ts';

/** Gives a person a password; their sessions and open links of before end. */
export async function setPassword(
  person: Person,
  passwordHash: string,
  action: string,
  transaction: Transaction,
): Promise<void> {
  await person.update({ passwordHash, sessionsValidFrom: new Date() }, { transaction });
  await endLinks(person.id, transaction);
  const subject = { kind: 'person', id: person.id };
  await recordChange({ by: person, action, subject }, transaction);
}
