import { UniqueConstraintError, type Transaction } from 'sequelize';
import type { z } from 'zod';
import type { newPersonSchema } from '../../shared/schemas/people.ts';
import { AppError } from '../errors.ts';
import { groupBy } from '../models/group-by.ts';
import { Membership } from '../models/membership.ts';
import { Person } from '../models/person.ts';
import { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { addressTaken } from './address-taken.ts';
import { issueLink } from './issue-link.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';
import { sendInvitation } from './send-invitation.ts';

type NewPerson = z.infer<typeof newPersonSchema>;

async function createPerson(
  { name, email, isAdministrator }: NewPerson,
  transaction: Transaction,
): Promise<Person> {
  try {
    return await Person.create({ name, email, isAdministrator }, { transaction });
  } catch (error) {
    throw error instanceof UniqueConstraintError ? addressTaken() : error;
  }
}

/** Every scheme is there and takes new people; in one order, so that two who invite at once take turns. */
async function lockSchemes(
  memberships: NewPerson['memberships'],
  transaction: Transaction,
): Promise<void> {
  const ids = memberships.map(({ schemeId }) => schemeId);
  const schemes = await Scheme.findAll({ where: { id: ids }, order: ['id'], transaction });
  const known = new Set(schemes.map(({ id }) => id));
  const fields = memberships.flatMap(({ schemeId }, index) =>
    known.has(schemeId)
      ? []
      : [{ path: `memberships.${index}.schemeId`, message: 'There is no such scheme.' }],
  );
  if (fields.length > 0) throw new AppError('invalid-input', undefined, fields);
  for (const scheme of schemes) await lockScheme(scheme, transaction);
}

async function giveRoles(
  by: Actor,
  person: Person,
  memberships: NewPerson['memberships'],
  transaction: Transaction,
): Promise<void> {
  for (const [schemeId, given] of groupBy(memberships, (one) => one.schemeId)) {
    const roles = [...new Set(given.map(({ role }) => role))].sort();
    await Membership.bulkCreate(
      roles.map((role) => ({ schemeId, personId: person.id, role })),
      { transaction },
    );
    const subject = { kind: 'person', id: person.id };
    await recordChange(
      { by, schemeId, action: 'change roles', subject, before: { roles: [] }, after: { roles } },
      transaction,
    );
  }
}

/** Makes a person with their roles and sends them a link to choose a password. */
export async function invitePerson(
  services: Services,
  by: Actor,
  wanted: NewPerson,
): Promise<string> {
  return services.database.transaction(async (transaction) => {
    await lockSchemes(wanted.memberships, transaction);
    const made = await createPerson(wanted, transaction);
    const { name, email, isAdministrator } = made;
    const subject = { kind: 'person', id: made.id };
    const after = { name, email, isAdministrator };
    await recordChange({ by, action: 'invite person', subject, after }, transaction);
    await giveRoles(by, made, wanted.memberships, transaction);
    const link = await issueLink(services.env, made.id, 'invitation', transaction);
    await sendInvitation(services, by, { personId: made.id, link }, transaction);
    return made.id;
  });
}
