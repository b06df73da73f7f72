import type { PersonAnswer } from '../../shared/schemas/people.ts';
import type { PersonRecord } from '../models/find-person-records.ts';

/** What leaves the server of a person, for the administrator. */
export function presentPerson({ person, memberships, invitedUntil }: PersonRecord): PersonAnswer {
  const hasPassword = person.passwordHash !== null;
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    isAdministrator: person.isAdministrator,
    hasPassword,
    invitedUntil: invitedUntil?.toISOString() ?? null,
    createdAt: person.createdAt.toISOString(),
    memberships: memberships.map(({ schemeId, schemeName, role }) => ({
      schemeId,
      schemeName,
      role,
    })),
    abilities: { invite: !hasPassword },
  };
}
