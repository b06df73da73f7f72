import { AppError } from '../errors.ts';
import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { endLinks } from './end-links.ts';
import { recordChange } from './record-change.ts';
import { requireAnotherAdministrator } from './require-another-administrator.ts';

/** Keeps a person from signing in, or lets them in again. Sessions and links end; what they are stays. */
export async function shutOutPerson(
  { database }: Services,
  by: Actor,
  personId: string,
  shutOut: boolean,
): Promise<void> {
  await database.transaction(async (transaction) => {
    const person = await Person.findByPk(personId, { transaction });
    if (person === null) throw new AppError('not-found');
    if (shutOut && person.isAdministrator) await requireAnotherAdministrator(person, transaction);
    if (shutOut && person.id === by.id) {
      throw new AppError('conflict', 'Nobody shuts themselves out. Ask another administrator.');
    }
    await person.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE });
    if (shutOut === (person.shutOutAt !== null)) return;
    const now = new Date();
    const before = { shutOutAt: person.shutOutAt };
    const after = { shutOutAt: shutOut ? now : null };
    await person.update({ ...after, sessionsValidFrom: now }, { transaction });
    await endLinks(person.id, transaction);
    const action = shutOut ? 'shut out person' : 'readmit person';
    const subject = { kind: 'person', id: person.id };
    await recordChange({ by, action, subject, before, after }, transaction);
  });
}
