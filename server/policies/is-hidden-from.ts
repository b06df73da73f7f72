import type { Actor } from './actor.ts';

/**
 * Whether something that was written to or by a party is kept from somebody: once personal data have been
 * erased, it is the administrator's alone to see.
 */
export function isHiddenFrom({ isAdministrator }: Actor, isErased: boolean): boolean {
  return isErased && !isAdministrator;
}
