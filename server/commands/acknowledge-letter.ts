import { acknowledgedMail } from '../mail/letters/acknowledged.ts';
import { ownerHomeUrl } from '../mail/letters/owner-home-url.ts';
import type { FoundOwnLetter } from '../models/find-own-letters.ts';
import { keepAcknowledgement } from '../models/keep-acknowledgement.ts';
import { Person } from '../models/person.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Records that an owner has read a letter, and confirms it by mail. Twice is once. */
export async function acknowledgeLetter(
  { database, outbox, env }: Services,
  actor: Actor,
  scheme: Scheme,
  letter: FoundOwnLetter,
): Promise<void> {
  const how = 'on the page';
  await database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const kept = { letterId: letter.id, by: actor.id, how };
    if (!(await keepAcknowledgement(database, kept, transaction))) return;
    const subject = { kind: 'letter', id: letter.id };
    const change = { by: actor, schemeId: scheme.id, action: 'acknowledge letter', subject };
    await recordChange({ ...change, after: { how } }, transaction);
    const person = await Person.findByPk(actor.id, { rejectOnEmpty: true, transaction });
    const page = ownerHomeUrl(env.PUBLIC_URL, scheme.id);
    const mail = acknowledgedMail(person, letter, page);
    const to = { schemeId: scheme.id, partyId: letter.partyId, recipient: person.email };
    await outbox.put([{ ...to, ...mail }], transaction);
  });
}
