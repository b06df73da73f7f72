import { literal, Op } from 'sequelize';
import type { Role } from '../../shared/schemas/roles.ts';
import { AppError } from '../errors.ts';
import { groupBy } from './group-by.ts';
import { Membership } from './membership.ts';
import { Person } from './person.ts';
import { Scheme } from './scheme.ts';
import { SingleUseLink } from './single-use-link.ts';

/** A person with what they are in which scheme, and their open invitation. */
export type PersonRecord = {
  readonly person: Person;
  readonly memberships: readonly {
    readonly schemeId: string;
    readonly schemeName: string;
    readonly role: Role;
  }[];
  readonly invitedUntil: Date | null;
};

async function schemeNames(memberships: readonly Membership[]): Promise<Map<string, string>> {
  const ids = [...new Set(memberships.map(({ schemeId }) => schemeId))];
  const schemes = await Scheme.findAll({ where: { id: ids }, attributes: ['id', 'name'] });
  return new Map(schemes.map(({ id, name }) => [id, name]));
}

/** Everybody, or some by id, in the order of their names. */
export async function findPersonRecords(ids?: readonly string[]): Promise<PersonRecord[]> {
  const some = ids === undefined ? {} : { personId: [...ids] };
  const [people, memberships, invitations] = await Promise.all([
    Person.findAll({
      where: ids === undefined ? {} : { id: [...ids] },
      order: literal('name collate "und-x-icu", email'),
    }),
    Membership.findAll({ where: some, order: ['schemeId', 'role'] }),
    SingleUseLink.findAll({
      where: {
        ...some,
        purpose: 'invitation',
        usedAt: null,
        expiresAt: { [Op.gt]: new Date() },
      },
    }),
  ]);
  const names = await schemeNames(memberships);
  const until = new Map(invitations.map(({ personId, expiresAt }) => [personId, expiresAt]));
  const held = groupBy(memberships, ({ personId }) => personId);
  return people.map((person) => ({
    person,
    memberships: (held.get(person.id) ?? []).map(({ schemeId, role }) => ({
      schemeId,
      schemeName: names.get(schemeId) ?? '',
      role,
    })),
    invitedUntil: until.get(person.id) ?? null,
  }));
}

export async function findPersonRecord(personId: string): Promise<PersonRecord> {
  const [record] = await findPersonRecords([personId]);
  if (record === undefined) throw new AppError('not-found');
  return record;
}
