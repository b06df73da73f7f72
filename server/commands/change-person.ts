import { UniqueConstraintError, type Transaction } from 'sequelize';
import type { z } from 'zod';
import type { changePersonSchema } from '../../shared/schemas/people.ts';
import { AppError } from '../errors.ts';
import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { addressTaken } from './address-taken.ts';
import { endLinks } from './end-links.ts';
import { recordChange } from './record-change.ts';
import { requireAnotherAdministrator } from './require-another-administrator.ts';

/** Writes the new values; a link that went to a wrong address ends. */
async function update(
  person: Person,
  after: Pick<Person, 'name' | 'email' | 'isAdministrator'>,
  transaction: Transaction,
): Promise<void> {
  if (after.email !== person.email) {
    if (person.passwordHash !== null) {
      const message = 'They sign in with this address. It stays.';
      throw new AppError('invalid-input', undefined, [{ path: 'email', message }]);
    }
    await endLinks(person.id, transaction);
  }
  try {
    await person.update(after, { transaction });
  } catch (error) {
    throw error instanceof UniqueConstraintError ? addressTaken() : error;
  }
}

/**
 * Changes a person's name, the address of one who has no password yet, or takes and gives the
 * administrator's rights, which acts at once.
 */
export async function changePerson(
  { database }: Services,
  by: Actor,
  personId: string,
  { name, email, isAdministrator }: z.infer<typeof changePersonSchema>,
): Promise<void> {
  await database.transaction(async (transaction) => {
    const person = await Person.findByPk(personId, { transaction });
    if (person === null) throw new AppError('not-found');
    if (person.isAdministrator && isAdministrator === false) {
      await requireAnotherAdministrator(person, transaction);
    }
    await person.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE });
    const before = { name: person.name, isAdministrator: person.isAdministrator };
    const after = {
      name: name ?? before.name,
      isAdministrator: isAdministrator ?? before.isAdministrator,
    };
    const [from, to] = [person.email, email ?? person.email];
    await update(person, { ...after, email: to }, transaction);
    const moved = from !== to;
    await recordChange(
      {
        by,
        action: 'change person',
        subject: { kind: 'person', id: person.id },
        before: moved ? { ...before, email: from } : before,
        after: moved ? { ...after, email: to } : after,
      },
      transaction,
    );
  });
}
