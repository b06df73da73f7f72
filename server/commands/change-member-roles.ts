import type { Role } from '../../shared/schemas/roles.ts';
import { AppError } from '../errors.ts';
import { Membership } from '../models/membership.ts';
import { Person } from '../models/person.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Gives a person these roles in a scheme and no others. */
export async function changeMemberRoles(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  change: { readonly personId: string; readonly roles: readonly Role[] },
): Promise<Person> {
  const { personId } = change;
  const member = { schemeId: scheme.id, personId };
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const person = await Person.findByPk(personId, { transaction });
    if (person === null) throw new AppError('not-found');
    const held = await Membership.findAll({ where: member, transaction });
    const before = { roles: held.map(({ role }) => role).sort() };
    const after = { roles: [...change.roles].sort() };
    if (before.roles.join() === after.roles.join()) return person;
    await Membership.destroy({ where: member, transaction });
    const rows = after.roles.map((role) => ({ ...member, role }));
    await Membership.bulkCreate(rows, { transaction });
    const subject = { kind: 'person', id: personId };
    await recordChange(
      { by: actor, schemeId: scheme.id, action: 'change roles', subject, before, after },
      transaction,
    );
    return person;
  });
}
