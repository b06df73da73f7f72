import { holds, type SchemeActor } from './actor.ts';

/**
 * Who may do what in a scheme. Each is asked after the scheme is loaded and before anything is done; the
 * answers also go to the client as abilities, so that screens show only what may be done.
 */
export const schemePolicy = {
  readScheme: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness', 'owner'),
  readRegister: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  updateScheme: (actor: SchemeActor) => actor.isAdministrator,
  archiveScheme: (actor: SchemeActor) => actor.isAdministrator,
  manageMembers: (actor: SchemeActor) => actor.isAdministrator,
  readRules: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  updateRules: (actor: SchemeActor) => actor.isAdministrator,
  updateBackground: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor'),
} as const satisfies Record<string, (actor: SchemeActor) => boolean>;

export type SchemeAction = keyof typeof schemePolicy;

/** The answer to every question of the policy, for the client. */
export function schemeAbilities(actor: SchemeActor): Record<SchemeAction, boolean> {
  return {
    readScheme: schemePolicy.readScheme(actor),
    readRegister: schemePolicy.readRegister(actor),
    updateScheme: schemePolicy.updateScheme(actor),
    archiveScheme: schemePolicy.archiveScheme(actor),
    manageMembers: schemePolicy.manageMembers(actor),
    readRules: schemePolicy.readRules(actor),
    updateRules: schemePolicy.updateRules(actor),
    updateBackground: schemePolicy.updateBackground(actor),
  };
}
