import { literal, Op, type Transaction } from 'sequelize';
import { personSchema, type PersonAnswer } from '../../shared/schemas/people.ts';
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
  /** How the letter of the open invitation fares. */
  readonly letter: PersonAnswer['letter'];
};

/** The newest mail that carries a link. */
const LETTER = `(
  select json_build_object('state', o.state, 'serverWords', o.server_words) from outbox o
  where o.link_id = "SingleUseLink".id order by o.put_in_at desc limit 1
)`;

async function schemeNames(
  memberships: readonly Membership[],
  transaction: Transaction | null,
): Promise<Map<string, string>> {
  const ids = [...new Set(memberships.map(({ schemeId }) => schemeId))];
  const where = { id: ids };
  const schemes = await Scheme.findAll({ where, attributes: ['id', 'name'], transaction });
  return new Map(schemes.map(({ id, name }) => [id, name]));
}

/** Everybody, or some by id, in the order of their names. */
export async function findPersonRecords(
  ids?: readonly string[],
  transaction: Transaction | null = null,
): Promise<PersonRecord[]> {
  const some = ids === undefined ? {} : { personId: [...ids] };
  const [people, memberships, invitations] = await Promise.all([
    Person.findAll({
      where: ids === undefined ? {} : { id: [...ids] },
      order: literal('name collate "und-x-icu", email'),
      transaction,
    }),
    Membership.findAll({ where: some, order: ['schemeId', 'role'], transaction }),
    SingleUseLink.findAll({
      where: {
        ...some,
        purpose: 'invitation',
        usedAt: null,
        expiresAt: { [Op.gt]: new Date() },
      },
      attributes: { include: [[literal(LETTER), 'letter']] },
      transaction,
    }),
  ]);
  const names = await schemeNames(memberships, transaction);
  const invited = new Map(invitations.map((link) => [link.personId, link]));
  const held = groupBy(memberships, ({ personId }) => personId);
  return people.map((person) => ({
    person,
    memberships: (held.get(person.id) ?? []).map(({ schemeId, role }) => ({
      schemeId,
      schemeName: names.get(schemeId) ?? '',
      role,
    })),
    invitedUntil: invited.get(person.id)?.expiresAt ?? null,
    letter: personSchema.shape.letter.parse(invited.get(person.id)?.get('letter') ?? null),
  }));
}

export async function findPersonRecord(
  personId: string,
  transaction: Transaction | null = null,
): Promise<PersonRecord> {
  const [record] = await findPersonRecords([personId], transaction);
  if (record === undefined) throw new AppError('not-found');
  return record;
}
