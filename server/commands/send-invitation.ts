import { invitationLetter } from '../mail/letters/invitation.ts';
import { findPersonRecords } from '../models/find-person-records.ts';
import { groupBy } from '../models/group-by.ts';
import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import type { IssuedLink } from './issue-link.ts';
import { sendLetter } from './send-letter.ts';

/** Sends the letter of an invitation; whether it went out. */
export async function sendInvitation(
  services: Services,
  by: Actor,
  personId: string,
  link: IssuedLink,
): Promise<boolean> {
  const [inviter, [record]] = await Promise.all([
    Person.findByPk(by.id, { rejectOnEmpty: true }),
    findPersonRecords([personId]),
  ]);
  if (record === undefined) return false;
  const bySchemes = groupBy(record.memberships, ({ schemeId }) => schemeId);
  const parts = [...bySchemes.values()].map((held) => ({
    schemeName: held[0]?.schemeName ?? '',
    roles: held.map(({ role }) => role),
  }));
  const { person } = record;
  return sendLetter(services, invitationLetter({ person, inviter, parts, link }));
}
