import { passwordResetMail } from '../mail/letters/password-reset.ts';
import { findPersonByEmail } from '../models/find-person-by-email.ts';
import type { Services } from '../services.ts';
import { issueLink } from './issue-link.ts';
import { recordChange } from './record-change.ts';

/**
 * Sends a link for a new password to an address that is known. Who was never here has an invitation,
 * whose end is the administrator's to set; who is shut out gets none.
 */
export async function requestPasswordReset(services: Services, email: string): Promise<void> {
  const person = await findPersonByEmail(email);
  if (!person?.passwordHash) return;
  await services.database.transaction(async (transaction) => {
    await person.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE });
    if (person.shutOutAt !== null) return;
    const subject = { kind: 'person', id: person.id };
    await recordChange({ by: null, action: 'ask for password reset', subject }, transaction);
    const link = await issueLink(services.env, person.id, 'password-reset', transaction);
    await services.outbox.put([passwordResetMail(person, link)], transaction);
  });
}
