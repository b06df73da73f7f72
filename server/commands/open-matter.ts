import type { Sequelize, Transaction } from 'sequelize';
import type { KeptSuggestion } from '../../shared/schemas/matter-answers.ts';
import { MATTER_LIMITS, type NewMatter } from '../../shared/schemas/matters.ts';
import { AppError } from '../errors.ts';
import { matterReceivedMail } from '../mail/letters/matter-mails.ts';
import { Building } from '../models/building.ts';
import { findOwn, type Own } from '../models/find-own.ts';
import { countOpenOf, insertMatter, insertMessage } from '../models/matter-changes.ts';
import { findMatterThreads, type FoundMatter } from '../models/matters.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { Person } from '../models/person.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { answerBy } from './answer-by.ts';
import { readMatter, recordMatter } from './kept-matter.ts';
import { lockScheme } from './lock-scheme.ts';
import { isSameMessage, numberedByOthers, otherMessage } from './same-message.ts';

/** The matter where it is there already; another one under its number is refused. */
async function findSame(
  database: Sequelize,
  scheme: Scheme,
  own: Own,
  matter: NewMatter,
  transaction: Transaction,
): Promise<FoundMatter | undefined> {
  const which = { id: matter.id, parties: own.parties };
  const [found] = await findMatterThreads(database, scheme.id, which, transaction);
  if (found === undefined) return undefined;
  const { kind, title, building } = found;
  const isSame =
    kind === matter.kind && title === matter.title && building.id === matter.buildingId;
  if (!isSame || !isSameMessage(found.messages[0], matter)) throw otherMessage();
  return found;
}

async function suggestionOf(
  { suggestion, buildingId }: NewMatter,
  transaction: Transaction,
): Promise<KeptSuggestion | null> {
  if (suggestion === null) return null;
  const building = await Building.findByPk(buildingId, { transaction, rejectOnEmpty: true });
  return { ...suggestion, was: building[suggestion.field], isTakenOver: false };
}

async function write(
  services: Services,
  by: Actor,
  scheme: Scheme,
  { partyId, ...matter }: NewMatter & { readonly partyId: string },
  transaction: Transaction,
): Promise<void> {
  const { database, env, outbox } = services;
  const { id, kind, title, buildingId } = matter;
  const { settings } = await heldSettings(database, scheme, transaction);
  const due = answerBy(kind, new Date(), settings);
  const suggestion = await suggestionOf(matter, transaction);
  const opened = { ...matter, partyId, suggestion, due, schemeId: scheme.id, openedBy: by.id };
  const number = await insertMatter(database, opened, transaction);
  const message = { ...matter, matterId: id, by: by.id, side: 'owner' } as const;
  await insertMessage(database, message, transaction);
  const after = { number, kind, building: buildingId, photographs: matter.photographs.length };
  await recordMatter(by, scheme, { id, action: 'bring up matter', after }, transaction);
  const to = await Person.findByPk(by.id, { transaction, rejectOnEmpty: true });
  const facts = { publicUrl: env.PUBLIC_URL, schemeId: scheme.id, partyId, to, title };
  const mail = matterReceivedMail({ ...facts, isConcern: kind === 'concern', due });
  await outbox.put([mail], transaction);
}

/**
 * Brings a matter up for an owner at a building of theirs, and confirms it by mail. The same matter sent again
 * is brought up once; tells whether it was brought up now.
 */
export async function openMatter(
  services: Services,
  by: Actor,
  scheme: Scheme,
  matter: NewMatter,
): Promise<{ matter: FoundMatter; isNew: boolean }> {
  const { database } = services;
  return numberedByOthers(database, async (transaction) => {
    await lockScheme(scheme, transaction);
    const own = await findOwn(database, scheme.id, by.id, transaction);
    const same = await findSame(database, scheme, own, matter, transaction);
    if (same !== undefined) return { matter: same, isNew: false };
    const place = own.buildings.find(({ id }) => id === matter.buildingId);
    if (place === undefined) throw new AppError('not-found');
    if ((await countOpenOf(database, by.id, transaction)) >= MATTER_LIMITS.openOfOneOwner) {
      const message = 'So much is open already. Wait for answers, or add to what is there.';
      throw new AppError('too-many-requests', message);
    }
    await write(services, by, scheme, { ...matter, partyId: place.partyId }, transaction);
    const written = await readMatter(database, scheme.id, { id: matter.id }, transaction);
    return { matter: written, isNew: true };
  });
}
