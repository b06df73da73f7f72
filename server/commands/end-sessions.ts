import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { recordChange } from './record-change.ts';

/** Ends every session of a person, wherever they are signed in. */
export async function endSessions({ database }: Services, actor: Actor): Promise<void> {
  await database.transaction(async (transaction) => {
    await Person.update(
      { sessionsValidFrom: new Date() },
      { where: { id: actor.id }, transaction },
    );
    const subject = { kind: 'person', id: actor.id };
    await recordChange({ by: actor, action: 'sign out everywhere', subject }, transaction);
  });
}
