import { AppError } from '../errors.ts';
import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { endLinks } from './end-links.ts';
import { recordChange } from './record-change.ts';

/** Takes back an invitation that nobody has accepted: its link ends. The person and their roles stay. */
export async function withdrawInvitation(
  { database }: Services,
  by: Actor,
  personId: string,
): Promise<void> {
  await database.transaction(async (transaction) => {
    const person = await Person.findByPk(personId, {
      transaction,
      lock: transaction.LOCK.NO_KEY_UPDATE,
    });
    if (person === null) throw new AppError('not-found');
    if (person.passwordHash !== null) {
      throw new AppError('conflict', 'They have accepted it already. Shut them out instead.');
    }
    await endLinks(person.id, transaction);
    const subject = { kind: 'person', id: person.id };
    await recordChange({ by, action: 'withdraw invitation', subject }, transaction);
  });
}
