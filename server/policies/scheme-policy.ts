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
  updateRegister: (actor: SchemeActor) => holds(actor, 'assessor'),
  readAlignments: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  updateAlignments: (actor: SchemeActor) => holds(actor, 'designer'),
  readRuns: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  startRuns: (actor: SchemeActor) => holds(actor, 'designer', 'assessor'),
  readEvidence: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  prepareEvidence: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  readVisits: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  recordVisits: (actor: SchemeActor) => holds(actor, 'assessor'),
  readDecisions: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  prepareDecisions: (actor: SchemeActor) => holds(actor, 'assessor'),
  checkDecisions: (actor: SchemeActor) => holds(actor, 'assessor'),
  assignBuildings: (actor: SchemeActor) => holds(actor, 'assessor'),
  updateMeasures: (actor: SchemeActor) => holds(actor, 'assessor', 'designer'),
  readParties: (actor: SchemeActor) => actor.isAdministrator || holds(actor, 'assessor'),
  updateParties: (actor: SchemeActor) => holds(actor, 'assessor'),
  erasePersonalData: (actor: SchemeActor) => actor.isAdministrator,
  readLetters: (actor: SchemeActor) => actor.isAdministrator || holds(actor, 'assessor'),
  prepareLetters: (actor: SchemeActor) => holds(actor, 'assessor'),
  checkLetters: (actor: SchemeActor) => actor.isAdministrator || holds(actor, 'assessor'),
  updateLetterTemplates: (actor: SchemeActor) => actor.isAdministrator,
  readMatters: (actor: SchemeActor) => actor.isAdministrator || holds(actor, 'assessor'),
  answerMatters: (actor: SchemeActor) => holds(actor, 'assessor'),
  readUndertakings: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  updateUndertakings: (actor: SchemeActor) => holds(actor, 'assessor'),
  readOwnBuildings: (actor: SchemeActor) => holds(actor, 'owner'),
  answerAsOwner: (actor: SchemeActor) => holds(actor, 'owner'),
  updateScheme: (actor: SchemeActor) => actor.isAdministrator,
  archiveScheme: (actor: SchemeActor) => actor.isAdministrator,
  readMembers: (actor: SchemeActor) => actor.isAdministrator,
  manageMembers: (actor: SchemeActor) => actor.isAdministrator,
  readRules: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor', 'witness'),
  updateRules: (actor: SchemeActor) => actor.isAdministrator,
  updateBackground: (actor: SchemeActor) =>
    actor.isAdministrator || holds(actor, 'designer', 'assessor'),
} as const satisfies Record<string, (actor: SchemeActor) => boolean>;

export type SchemeAction = keyof typeof schemePolicy;

/** What changes what a scheme holds: not in an archived one. */
const CHANGES: ReadonlySet<SchemeAction> = new Set([
  'updateRegister',
  'updateAlignments',
  'startRuns',
  'prepareEvidence',
  'prepareDecisions',
  'checkDecisions',
  'assignBuildings',
  'updateMeasures',
  'recordVisits',
  'updateParties',
  'prepareLetters',
  'checkLetters',
  'updateLetterTemplates',
  'answerMatters',
  'updateUndertakings',
  'answerAsOwner',
  'updateScheme',
  'manageMembers',
  'updateRules',
  'updateBackground',
]);

export function changesScheme(action: SchemeAction): boolean {
  return CHANGES.has(action);
}

/** The answer to every question of the policy, for the client. */
export function schemeAbilities(
  actor: SchemeActor,
  isArchived: boolean,
): Record<SchemeAction, boolean> {
  const can = (action: SchemeAction) =>
    schemePolicy[action](actor) && !(isArchived && changesScheme(action));
  return {
    readScheme: can('readScheme'),
    readRegister: can('readRegister'),
    updateRegister: can('updateRegister'),
    readAlignments: can('readAlignments'),
    updateAlignments: can('updateAlignments'),
    readRuns: can('readRuns'),
    startRuns: can('startRuns'),
    readEvidence: can('readEvidence'),
    prepareEvidence: can('prepareEvidence'),
    readVisits: can('readVisits'),
    recordVisits: can('recordVisits'),
    readDecisions: can('readDecisions'),
    prepareDecisions: can('prepareDecisions'),
    checkDecisions: can('checkDecisions'),
    assignBuildings: can('assignBuildings'),
    updateMeasures: can('updateMeasures'),
    readParties: can('readParties'),
    updateParties: can('updateParties'),
    erasePersonalData: can('erasePersonalData'),
    readLetters: can('readLetters'),
    prepareLetters: can('prepareLetters'),
    checkLetters: can('checkLetters'),
    updateLetterTemplates: can('updateLetterTemplates'),
    readMatters: can('readMatters'),
    answerMatters: can('answerMatters'),
    readUndertakings: can('readUndertakings'),
    updateUndertakings: can('updateUndertakings'),
    readOwnBuildings: can('readOwnBuildings'),
    answerAsOwner: can('answerAsOwner'),
    updateScheme: can('updateScheme'),
    archiveScheme: can('archiveScheme'),
    readMembers: can('readMembers'),
    manageMembers: can('manageMembers'),
    readRules: can('readRules'),
    updateRules: can('updateRules'),
    updateBackground: can('updateBackground'),
  };
}
