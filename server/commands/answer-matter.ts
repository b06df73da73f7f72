import type { Transaction } from 'sequelize';
import type { TeamMessage } from '../../shared/schemas/matters.ts';
import { AppError } from '../errors.ts';
import { matterAnsweredMail } from '../mail/letters/matter-mails.ts';
import { insertMessage, updateMatter } from '../models/matter-changes.ts';
import type { FoundMatter } from '../models/matters.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readerOf, readMatter, recordMatter, requireReader, standingOf } from './kept-matter.ts';
import { lockScheme } from './lock-scheme.ts';
import { isSameMessage, numberedByOthers, otherMessage } from './same-message.ts';

type Answer = Pick<TeamMessage, 'id' | 'text'>;

/** Keeps an answer of the team and sends it to the owner, where mail reaches them. */
export async function sendAnswer(
  { database, env, outbox }: Services,
  by: Actor,
  scheme: Scheme,
  { matter, message }: { readonly matter: FoundMatter; readonly message: Answer },
  transaction: Transaction,
): Promise<void> {
  const { id: matterId, title, party } = matter;
  const written = { ...message, matterId, by: by.id, side: 'team' as const, photographs: [] };
  await insertMessage(database, written, transaction);
  const to = await readerOf(matter, transaction);
  if (to === null) return;
  const facts = { publicUrl: env.PUBLIC_URL, schemeId: scheme.id, partyId: party.id, to, title };
  await outbox.put([matterAnsweredMail({ ...facts, text: message.text })], transaction);
}

async function write(
  services: Services,
  by: Actor,
  scheme: Scheme,
  { matter, message }: { readonly matter: FoundMatter; readonly message: TeamMessage },
  transaction: Transaction,
): Promise<void> {
  const { database } = services;
  const { id, number } = matter;
  requireReader(matter);
  if (message.side === 'note') {
    const note = { ...message, matterId: id, by: by.id, photographs: [] };
    await insertMessage(database, note, transaction);
    const told = { id, action: 'note on matter', after: { number } };
    await recordMatter(by, scheme, told, transaction);
    return;
  }
  if (matter.version !== message.version) throw new AppError('conflict');
  await sendAnswer(services, by, scheme, { matter, message }, transaction);
  await updateMatter(database, id, { ...standingOf(matter), state: 'answered' }, transaction);
  const told = { id, action: 'answer matter', after: { number, isMailed: matter.isMailed } };
  await recordMatter(by, scheme, told, transaction);
}

/**
 * Answers a matter, by mail too, or notes something inside the team. An answer is refused where the owner or
 * somebody else has written meanwhile, both where the party was erased. The same message sent again is kept once.
 */
export async function answerMatter(
  services: Services,
  by: Actor,
  scheme: Scheme,
  message: TeamMessage & { readonly matterId: string },
): Promise<{ matter: FoundMatter; isNew: boolean }> {
  const { database } = services;
  const which = { id: message.matterId };
  return numberedByOthers(database, async (transaction) => {
    await lockScheme(scheme, transaction);
    const matter = await readMatter(database, scheme.id, which, transaction);
    const kept = matter.messages.find(({ id }) => id === message.id);
    if (kept !== undefined) {
      if (kept.side !== message.side || !isSameMessage(kept, message)) throw otherMessage();
      return { matter, isNew: false };
    }
    await write(services, by, scheme, { matter, message }, transaction);
    const written = await readMatter(database, scheme.id, which, transaction);
    return { matter: written, isNew: true };
  });
}
