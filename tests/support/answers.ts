import type { BuildingAnswer } from '../../shared/schemas/buildings.ts';
import type { MemberAnswer } from '../../shared/schemas/members.ts';
import type { PersonAnswer } from '../../shared/schemas/people.ts';
import type { RegisterRow } from '../../shared/schemas/register.ts';
import type { RulesVersion } from '../../shared/schemas/rules.ts';
import type { SchemeAnswer } from '../../shared/schemas/schemes.ts';
import type { SessionAnswer } from '../../shared/schemas/session.ts';
import { defaultRules } from '../../server/commands/default-rules.ts';

/** An id that is one; `n` tells it from others. */
export function anId(n = 1): string {
  return `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`;
}

/** The session of an assessor, unless said otherwise. */
export function aSession(
  person: Partial<NonNullable<SessionAnswer['person']>> | null = {},
): SessionAnswer {
  const known = { id: anId(), name: 'Assessor', email: 'assessor@example.org' };
  return {
    csrfToken: 'token',
    demo: true,
    person: person === null ? null : { ...known, isAdministrator: false, ...person },
  };
}

/** A scheme in which the caller may read everything and change nothing. */
export function aSchemeAnswer(overrides: Partial<SchemeAnswer> = {}): SchemeAnswer {
  return {
    id: anId(10),
    name: 'Port Dogger crossing',
    description: '',
    crs: 32631,
    archivedAt: null,
    version: 1,
    registerVersion: 1,
    backgroundVersion: 1,
    roles: ['assessor'],
    abilities: { readScheme: true, readRegister: true, readRules: true },
    ...overrides,
  };
}

/** A person who can sign in, as the administrator sees them. */
export function aPersonAnswer(overrides: Partial<PersonAnswer> = {}): PersonAnswer {
  return {
    id: anId(20),
    name: 'Designer',
    email: 'designer@example.org',
    isAdministrator: false,
    hasPassword: true,
    invitedUntil: null,
    letter: null,
    shutOutAt: null,
    createdAt: '2026-05-01T09:00:00.000Z',
    memberships: [],
    abilities: {
      invite: false,
      withdraw: false,
      changeEmail: false,
      shutOut: true,
      readmit: false,
    },
    ...overrides,
  };
}

/** An assessor of a scheme. */
export function aMemberAnswer(overrides: Partial<MemberAnswer> = {}): MemberAnswer {
  return {
    person: { id: anId(30), name: 'Assessor', email: 'assessor@example.org' },
    roles: ['assessor'],
    accepted: true,
    ...overrides,
  };
}

/** Version 1 of a scheme's rules: the defaults. */
export function aRulesVersion(overrides: Partial<RulesVersion> = {}): RulesVersion {
  return {
    version: 1,
    rules: defaultRules('2026-05-01'),
    createdAt: '2026-05-01T09:00:00.000Z',
    createdBy: { id: anId(40), name: 'Administrator' },
    ...overrides,
  };
}

/** A projected system. */
export function aCrsAnswer() {
  return {
    code: 32631,
    name: 'WGS 84 / UTM zone 31N',
    area: 'North Sea.',
    definition: '+proj=utm +zone=31',
    bounds: [0, 0, 6, 84],
  };
}

const NO_RESULTS = {
  stage: null,
  ...{ chainage: null, offset: null },
  ...{ state: null, decision: null, assignedTo: null },
  categoryLow: null,
  category: null,
  categoryHigh: null,
  strain: null,
  settlement: null,
  slope: null,
  breakpoint: null,
  reserve: null,
  settled: null,
  heldBy: null,
};

/** A building of which everything is known. */
function aKnownBuilding() {
  return {
    id: 1,
    reference: 'B0001',
    centre: [1.64, 54.75],
    name: null,
    address: '10 Net Street',
    use: 'terrace',
    storeys: 2,
    eavesHeight: 6.2,
    groundLevel: 3,
    foundingLevel: 1.6,
    foundation: 'strip',
    construction: 'masonry',
    eOverG: 2.6,
    poisson: 0.3,
    listedGrade: 'not listed',
    condition: 'good',
    inspected: 'outside',
    ...{ structureScore: null, structureReason: null, featuresScore: null, featuresReason: null },
    area: 84.5,
    groundLevelFrom: 'file',
    assumed: [],
    version: 1,
  } satisfies Partial<RegisterRow>;
}

/** A row of the register that no run has been over. */
export function aRegisterRow(overrides: Partial<RegisterRow> = {}): RegisterRow {
  return { ...aKnownBuilding(), ...NO_RESULTS, ...overrides };
}

/** The same building with all that is answered of one. */
export function aBuildingAnswer(overrides: Partial<BuildingAnswer> = {}): BuildingAnswer {
  return {
    ...aKnownBuilding(),
    footprint: [],
    bounds: [1.63, 54.74, 1.65, 54.76],
    walls: [],
    ...overrides,
  };
}
