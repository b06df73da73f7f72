import type { Role } from '../../shared/schemas/roles.ts';

/** Who asks: a signed-in person, as policies see them. */
export type Actor = { readonly id: string; readonly isAdministrator: boolean };

/** The roles that the actor holds in the scheme at hand; the administrator may hold none. */
export type SchemeActor = Actor & { readonly roles: ReadonlySet<Role> };

export function holds(actor: SchemeActor, ...roles: readonly Role[]): boolean {
  return roles.some((role) => actor.roles.has(role));
}
