import { Scheme } from '../models/scheme.ts';
import { findLetters, type FoundLetter } from '../models/letters.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { ownerHomeUrl } from '../mail/letters/owner-home-url.ts';
import type { OutgoingMail } from '../mail/outbox.ts';
import type { Services } from '../services.ts';

function reminder(
  schemeId: string,
  letter: FoundLetter,
  contact: string,
  url: string,
): OutgoingMail {
  return {
    ...{ schemeId, recipient: letter.email ?? '', letterId: letter.id, isReminder: true },
    subject: `A reminder: ${letter.subject}`,
    parts: [
      `Dear ${letter.name},`,
      'We wrote to you some time ago, and have not heard from you yet. Perhaps our letter did not reach you, or lies about.',
      'Please tell us on your page that you have it. That takes a minute.',
      { label: 'Open your page', url },
      `If you have no password yet, use the link in our first letter, or ask us: ${contact}.`,
    ],
  };
}

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
      const late = (await findLetters(database, id, which, transaction)).filter(
        ({ channel, remindedAt, isErased, email, delivery }) =>
          channel === 'e-mail' &&
          email !== null &&
          remindedAt === null &&
          !isErased &&
          delivery !== 'failed',
      );
      const url = ownerHomeUrl(env.PUBLIC_URL, id);
      const mails = late.map((letter) => reminder(id, letter, settings.contact.email, url));
      await outbox.put(mails, transaction);
      return mails.length;
    });
  }
  return count;
}
