import { describe, expect, test } from 'vitest';
import { ROLES, type Role } from '../../../shared/schemas/roles.ts';
import {
  changesScheme,
  schemeAbilities,
  schemePolicy,
  type SchemeAction,
} from '../../../server/policies/scheme-policy.ts';

/** Who may do what, as people agreed on it: the policy is held against this. */
const MAY: Readonly<Record<SchemeAction, readonly (Role | 'administrator')[]>> = {
  readScheme: ['designer', 'assessor', 'owner', 'witness', 'administrator'],
  readRegister: ['designer', 'assessor', 'witness', 'administrator'],
  updateRegister: ['assessor'],
  readAlignments: ['designer', 'assessor', 'witness', 'administrator'],
  updateAlignments: ['designer'],
  readRuns: ['designer', 'assessor', 'witness', 'administrator'],
  startRuns: ['designer', 'assessor'],
  readEvidence: ['designer', 'assessor', 'witness', 'administrator'],
  prepareEvidence: ['designer', 'assessor', 'witness', 'administrator'],
  readDecisions: ['administrator', 'designer', 'assessor', 'witness'],
  prepareDecisions: ['assessor'],
  checkDecisions: ['assessor'],
  assignBuildings: ['assessor'],
  updateMeasures: ['designer', 'assessor'],
  readVisits: ['designer', 'assessor', 'witness', 'administrator'],
  recordVisits: ['assessor'],
  readParties: ['assessor', 'administrator'],
  updateParties: ['assessor'],
  erasePersonalData: ['administrator'],
  readLetters: ['assessor', 'administrator'],
  prepareLetters: ['assessor'],
  checkLetters: ['assessor', 'administrator'],
  updateLetterTemplates: ['administrator'],
  readMatters: ['assessor', 'administrator'],
  answerMatters: ['assessor'],
  readUndertakings: ['designer', 'assessor', 'witness', 'administrator'],
  updateUndertakings: ['assessor'],
  readOwnBuildings: ['owner'],
  answerAsOwner: ['owner'],
  updateScheme: ['administrator'],
  archiveScheme: ['administrator'],
  readMembers: ['administrator'],
  manageMembers: ['administrator'],
  readRules: ['designer', 'assessor', 'witness', 'administrator'],
  updateRules: ['administrator'],
  updateBackground: ['designer', 'assessor', 'administrator'],
};

const ACTIONS = [
  'readScheme',
  'readRegister',
  'updateRegister',
  'readAlignments',
  'updateAlignments',
  'readRuns',
  'startRuns',
  'readEvidence',
  'prepareEvidence',
  'readVisits',
  'recordVisits',
  'readParties',
  'updateParties',
  'erasePersonalData',
  'readLetters',
  'prepareLetters',
  'checkLetters',
  'updateLetterTemplates',
  'readMatters',
  'answerMatters',
  'readUndertakings',
  'updateUndertakings',
  'readOwnBuildings',
  'answerAsOwner',
  'updateScheme',
  'archiveScheme',
  'readMembers',
  'manageMembers',
  'readRules',
  'updateRules',
  'updateBackground',
] as const satisfies readonly SchemeAction[];

function actor(...roles: (Role | 'administrator')[]) {
  return {
    id: 'a',
    isAdministrator: roles.includes('administrator'),
    roles: new Set(ROLES.filter((role) => roles.includes(role))),
  };
}

describe.each([...ROLES, 'administrator'] as const)('the %s', (role) => {
  test.each(ACTIONS)('may %s where the table says so', (action) => {
    expect(schemePolicy[action](actor(role))).toBe(MAY[action].includes(role));
  });
});

test('nobody else may do anything', () => {
  expect(Object.values(schemeAbilities(actor(), false))).not.toContain(true);
});

test('who is several may do what each of them may', () => {
  const abilities = schemeAbilities(actor('owner', 'designer'), false);
  const [one, other] = [
    schemeAbilities(actor('owner'), false),
    schemeAbilities(actor('designer'), false),
  ];
  for (const action of ACTIONS) expect(abilities[action]).toBe(one[action] || other[action]);
});

test('in an archived scheme everything is read and nothing is changed, but that it can be brought back', () => {
  const abilities = schemeAbilities(actor('administrator'), true);
  const may = (action: SchemeAction) => schemePolicy[action](actor('administrator'));
  for (const action of ACTIONS) {
    expect(abilities[action]).toBe(may(action) && !changesScheme(action));
  }
  expect(ACTIONS.filter(changesScheme)).toEqual([
    'updateRegister',
    'updateAlignments',
    'startRuns',
    'prepareEvidence',
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
});
