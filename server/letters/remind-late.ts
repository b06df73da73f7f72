import { Scheme } from '../models/scheme.ts';
import { findLetters } from '../models/letters.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { reminderMail } from '../mail/letters/reminder-mail.ts';
import type { Services } from '../services.ts';

/** Reminds everybody once who got a letter by mail and has not acknowledged it in the days they have. */
export async function remindLate({
  database,
  outbox,
  env,
}: Pick<Services, 'database' | 'outbox' | 'env'>): Promise<number> {
  const schemes = await Scheme.findAll({ where: { archivedAt: null }, order: ['id'] });
  let count = 0;
  for (const { id } of schemes) {
    count += await database.transaction(async (transaction) => {
      const lock = transaction.LOCK.UPDATE;
      const scheme = await Scheme.findByPk(id, { transaction, lock, rejectOnEmpty: true });
      const { settings } = await heldSettings(database, scheme, transaction);
      const which = { unansweredFor: settings.remindAfter };
      const late = await findLetters(database, id, which, transaction);
      const mails = late.flatMap(({ email, ...letter }) => {
        const { channel, remindedAt, isErased, delivery } = letter;
        const isReached = channel === 'e-mail' && email !== null && delivery !== 'failed';
        if (!isReached || remindedAt !== null || isErased) return [];
        const facts = { schemeId: id, publicUrl: env.PUBLIC_URL, contact: settings.contact.email };
        return [reminderMail({ ...facts, letter: { ...letter, email } })];
      });
      await outbox.put(mails, transaction);
      return mails.length;
    });
  }
  return count;
}
