import type { Role } from '../../../shared/schemas/roles.ts';

const WITH_ARTICLE: Readonly<Record<Role, string>> = {
  designer: 'a designer',
  assessor: 'an assessor',
  owner: 'an owner',
  witness: 'a witness',
};

/** What each role is there for, in a few words. */
export const ROLE_TASKS: Readonly<Record<Role, string>> = {
  designer: 'draws options and issues revisions',
  assessor: 'keeps the register, decides and checks',
  owner: 'sees their own buildings',
  witness: 'reads all but personal data, freezes bundles',
};

/** A role as it begins a line or stands in a list to choose from. */
export function roleName(role: Role): string {
  return role.charAt(0).toUpperCase() + role.slice(1);
}

/** As "you are a designer and an assessor". */
export function yourRoles(roles: readonly Role[]): string {
  if (roles.length === 0) return 'you administer it';
  return `you are ${roles.map((role) => WITH_ARTICLE[role]).join(' and ')}`;
}
