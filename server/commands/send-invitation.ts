import type { Transaction } from 'sequelize';
import { invitationMail } from '../mail/letters/invitation.ts';
import { findPersonRecord } from '../models/find-person-records.ts';
import { groupBy } from '../models/group-by.ts';
import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import type { IssuedLink } from './issue-link.ts';

/** Puts the letter of an invitation into the outbox. */
export async function sendInvitation(
  { outbox }: Pick<Services, 'outbox'>,
  by: Actor,
  { personId, link }: { readonly personId: string; readonly link: IssuedLink },
  transaction: Transaction,
): Promise<void> {
  const inviter = await Person.findByPk(by.id, { rejectOnEmpty: true, transaction });
  const { person, memberships } = await findPersonRecord(personId, transaction);
  const bySchemes = groupBy(memberships, ({ schemeId }) => schemeId);
  const parts = [...bySchemes.values()].map((held) => ({
    schemeName: held[0]?.schemeName ?? '',
    roles: held.map(({ role }) => role),
  }));
  await outbox.put([invitationMail({ person, inviter, parts, link })], transaction);
}
