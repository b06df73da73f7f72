import type { MemberAnswer } from '../../shared/schemas/members.ts';
import type { Role } from '../../shared/schemas/roles.ts';
import type { Person } from '../models/person.ts';

/** What leaves the server of a person in a scheme. */
export function presentMember(
  { id, name, email, passwordHash }: Person,
  roles: readonly Role[],
): MemberAnswer {
  return { person: { id, name, email }, roles: [...roles].sort(), accepted: passwordHash !== null };
}
