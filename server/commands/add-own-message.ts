import type { Transaction } from 'sequelize';
import type { OwnMessage } from '../../shared/schemas/matters.ts';
import { matterReceivedMail } from '../mail/letters/matter-mails.ts';
import { findOwn } from '../models/find-own.ts';
import { insertMessage, updateMatter } from '../models/matter-changes.ts';
import type { FoundMatter } from '../models/matters.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { Person } from '../models/person.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { answerBy } from './answer-by.ts';
import { readMatter, recordMatter, standingOf } from './kept-matter.ts';
import { lockScheme } from './lock-scheme.ts';
import { isSameMessage, numberedByOthers, otherMessage } from './same-message.ts';

type Sent = OwnMessage & { readonly matterId: string };

async function write(
  { database, env, outbox }: Services,
  by: Actor,
  scheme: Scheme,
  { matter, message }: { readonly matter: FoundMatter; readonly message: Sent },
  transaction: Transaction,
): Promise<void> {
  const { id, kind, title, number } = matter;
  const standing = standingOf(matter);
  const { settings } = await heldSettings(database, scheme, transaction);
  // what waits keeps the day that was promised; what is opened again gets a new one
  const due = matter.state === 'open' ? matter.due : answerBy(kind, new Date(), settings);
  await insertMessage(database, { ...message, by: by.id, side: 'owner' }, transaction);
  await updateMatter(database, id, { ...standing, state: 'open', due }, transaction);
  const after = { number, photographs: message.photographs.length };
  await recordMatter(by, scheme, { id, action: 'add to matter', after }, transaction);
  const to = await Person.findByPk(by.id, { transaction, rejectOnEmpty: true });
  const facts = {
    publicUrl: env.PUBLIC_URL,
    schemeId: scheme.id,
    partyId: matter.party.id,
    to,
    title,
  };
  const isLate = matter.isOverdue;
  const mail = { ...facts, isConcern: kind === 'concern', due: isLate ? null : due };
  await outbox.put([matterReceivedMail(mail)], transaction);
}

/**
 * Adds an owner's message to a matter of theirs, which opens it again, and confirms it by mail. The same
 * message sent again is added once; tells whether it was added now.
 */
export async function addOwnMessage(
  services: Services,
  by: Actor,
  scheme: Scheme,
  message: Sent,
): Promise<{ matter: FoundMatter; isNew: boolean }> {
  const { database } = services;
  return numberedByOthers(database, async (transaction) => {
    await lockScheme(scheme, transaction);
    const { parties } = await findOwn(database, scheme.id, by.id, transaction);
    const which = { id: message.matterId, parties };
    const matter = await readMatter(database, scheme.id, which, transaction);
    const kept = matter.messages.find(({ id }) => id === message.id);
    if (kept !== undefined) {
      if (kept.side !== 'owner' || !isSameMessage(kept, message)) throw otherMessage();
      return { matter, isNew: false };
    }
    await write(services, by, scheme, { matter, message }, transaction);
    const written = await readMatter(database, scheme.id, which, transaction);
    return { matter: written, isNew: true };
  });
}
