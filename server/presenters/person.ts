import type { PersonAnswer } from '../../shared/schemas/people.ts';
import type { PersonRecord } from '../models/find-person-records.ts';
import type { Actor } from '../policies/actor.ts';

/** What leaves the server of a person, for the administrator who asks. */
export function presentPerson(
  { person, memberships, invitedUntil, letter }: PersonRecord,
  actor: Actor,
): PersonAnswer {
  const hasPassword = person.passwordHash !== null;
  const isShutOut = person.shutOutAt !== null;
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    isAdministrator: person.isAdministrator,
    hasPassword,
    invitedUntil: invitedUntil?.toISOString() ?? null,
    letter: letter && { state: letter.state, serverWords: letter.serverWords },
    shutOutAt: person.shutOutAt?.toISOString() ?? null,
    createdAt: person.createdAt.toISOString(),
    memberships: memberships.map(({ schemeId, schemeName, role }) => ({
      schemeId,
      schemeName,
      role,
    })),
    abilities: {
      invite: !hasPassword && !isShutOut,
      withdraw: !hasPassword && invitedUntil !== null,
      changeEmail: !hasPassword,
      shutOut: !isShutOut && person.id !== actor.id,
      readmit: isShutOut,
    },
  };
}
