import { literal } from 'sequelize';
import type { Role } from '../../shared/schemas/roles.ts';
import { Membership } from './membership.ts';
import { Person } from './person.ts';

export type Member = { readonly person: Person; readonly roles: readonly Role[] };

/** Everybody in a scheme with their roles, by name. */
export async function findMembers(schemeId: string): Promise<Member[]> {
  const memberships = await Membership.findAll({ where: { schemeId } });
  const people = await Person.findAll({
    where: { id: memberships.map(({ personId }) => personId) },
    order: [literal('name collate "und-x-icu"'), 'id'],
  });
  return people.map((person) => ({
    person,
    roles: memberships.filter(({ personId }) => personId === person.id).map(({ role }) => role),
  }));
}
