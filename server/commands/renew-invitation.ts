import { AppError } from '../errors.ts';
import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { issueLink } from './issue-link.ts';
import { recordChange } from './record-change.ts';
import { sendInvitation } from './send-invitation.ts';

/** Sends somebody who has no password yet a new link; the old one ends. */
export async function renewInvitation(
  services: Services,
  by: Actor,
  personId: string,
): Promise<void> {
  await services.database.transaction(async (transaction) => {
    const person = await Person.findByPk(personId, {
      transaction,
      lock: transaction.LOCK.NO_KEY_UPDATE,
    });
    if (person === null) throw new AppError('not-found');
    if (person.shutOutAt !== null) throw new AppError('conflict', 'They are shut out.');
    if (person.passwordHash !== null) {
      throw new AppError('conflict', 'They have a password already. It can be reset at sign-in.');
    }
    const link = await issueLink(services.env, person.id, 'invitation', transaction);
    const subject = { kind: 'person', id: person.id };
    const after = { invitedUntil: link.until };
    await recordChange({ by, action: 'renew invitation', subject, after }, transaction);
    await sendInvitation(services, by, { personId, link }, transaction);
  });
}
