import { addresseeOf } from '../letters/compose-letters.ts';
import { linksForOwners } from '../letters/links-for-owners.ts';
import { mailParts } from '../letters/mail-parts.ts';
import type { OutgoingMail } from '../mail/outbox.ts';
import { LINK_LEFT_OPEN } from '../mail/render-letter.ts';
import { ownerHomeUrl } from '../mail/letters/owner-home-url.ts';
import { findParties } from '../models/find-interested.ts';
import { writeSending } from '../models/letter-batches.ts';
import { findLetters } from '../models/letters.ts';
import { makeOwnerAccounts } from '../models/owner-accounts.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readBatchAs } from './kept-batch.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/**
 * Sends a checked batch: what goes by mail is put into the outbox, with a link to the page of the owner, who
 * gets an account for it; what goes by post waits to be printed. All of it, or nothing.
 */
export async function sendLetters(
  services: Pick<Services, 'database' | 'outbox' | 'env'>,
  by: Actor,
  scheme: Scheme,
  batchId: string,
): Promise<void> {
  const { database, outbox, env } = services;
  await database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    await readBatchAs(database, scheme.id, batchId, 'checked', transaction);
    const letters = await findLetters(database, scheme.id, { batchId }, transaction);
    const mailed = letters.filter(
      ({ channel, email, isErased }) => channel === 'e-mail' && email !== null && !isErased,
    );
    const ids = [...new Set(mailed.map(({ partyId }) => partyId))];
    const parties = await findParties(database, scheme.id, ids, transaction);
    const readers = new Map(parties.map((one) => [one.partyId, addresseeOf(one).partyId]));
    const accounts = await makeOwnerAccounts(
      database,
      scheme.id,
      [...new Set(readers.values())],
      transaction,
    );
    const links = await linksForOwners(services, accounts, transaction);
    const people = new Map(accounts.map(({ partyId, personId }) => [partyId, personId]));
    const home = ownerHomeUrl(env.PUBLIC_URL, scheme.id);
    const mails = mailed.map((letter): OutgoingMail => {
      const linkId = links.get(people.get(readers.get(letter.partyId) ?? '') ?? '');
      return {
        ...{ schemeId: scheme.id, letterId: letter.id, subject: letter.subject },
        recipient: letter.email ?? '',
        parts: mailParts(letter.parts, linkId === undefined ? home : LINK_LEFT_OPEN),
        ...(linkId !== undefined && { linkId }),
      };
    });
    await writeSending(database, batchId, by.id, transaction);
    await outbox.put(mails, transaction);
    const subject = { kind: 'letters', id: batchId };
    const after = {
      byMail: mails.length,
      byPost: letters.length - mails.length,
      links: links.size,
    };
    await recordChange({ by, schemeId: scheme.id, action: 'send letters', subject, after }, transaction); // prettier-ignore
  });
}
