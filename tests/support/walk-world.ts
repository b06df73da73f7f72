import { randomUUID } from 'node:crypto';
import type TestAgent from 'supertest/lib/agent.js';
import { ROLES } from '../../shared/schemas/roles.ts';
import { defaultRules } from '../../server/commands/default-rules.ts';
import { NO_OPTIONS } from '../../server/imports/first-options.ts';
import type { Alignment } from '../../server/models/alignment.ts';
import { BackgroundFeature } from '../../server/models/background-feature.ts';
import type { Building } from '../../server/models/building.ts';
import type { Person } from '../../server/models/person.ts';
import { RegisterChange } from '../../server/models/register-change.ts';
import { RegisterImport } from '../../server/models/register-import.ts';
import { SchemeRules } from '../../server/models/scheme-rules.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import { Visit } from '../../server/models/visit.ts';
import { aBuilding, aMember, anAdministrator, anAlignment, aPerson, aScheme } from './factories.ts';
import { aRun } from './runs.ts';
import { signIn, visitor } from './sign-in.ts';
import type { TestApp } from './test-app.ts';

/** Who walks: each role of the scheme at hand, the administrator, a member of another scheme, and nobody. */
export const WALKERS = [...ROLES, 'administrator', 'stranger', 'nobody'] as const;
export type Walker = (typeof WALKERS)[number];

/** A scheme with something of everything in it, all of it marked by a word. */
export type Place = {
  readonly scheme: Scheme;
  readonly building: Building;
  readonly importId: string;
  readonly alignment: Alignment;
  readonly runId: string;
  readonly change: RegisterChange;
  readonly visitId: string;
  readonly mark: string;
};

async function aPlace(app: TestApp, mark: string, author: Person): Promise<Place> {
  const scheme = await aScheme({ name: `${mark} scheme`, description: `${mark} words` });
  const building = await aBuilding(scheme, { reference: `${mark}-1`, name: `${mark} house` });
  await BackgroundFeature.create({
    schemeId: scheme.id,
    layer: 'streets',
    name: `${mark} street`,
    geometry: { type: 'LineString', coordinates: [[3, 54], [3.1, 54]] }, // prettier-ignore
    ...{ west: 3, south: 54, east: 3.1, north: 54 },
  });
  const rules = defaultRules('2026-12-01');
  await SchemeRules.create({ schemeId: scheme.id, version: 1, rules, createdBy: author.id });
  const change = await RegisterChange.create({
    ...{ schemeId: scheme.id, personId: null, kind: 'draw' },
    ...{ source: `${mark} survey`, importId: null, undoes: null },
  });
  const sent = await RegisterImport.create({
    ...{ schemeId: scheme.id, personId: null, state: 'asking' },
    ...{ fileName: `${mark}.geojson`, options: NO_OPTIONS },
  });
  const visit = await Visit.create({
    ...{ id: randomUUID(), schemeId: scheme.id, buildingId: building.id, visitedAt: new Date() },
    ...{ visitedBy: author.id, part: 'outside', condition: null, construction: null },
    ...{ notes: `${mark} notes`, defects: [], changeId: null, fingerprint: mark },
  });
  const alignment = await anAlignment(scheme, { name: `${mark} option` });
  const { id: runId } = await aRun(app, scheme, alignment);
  return { scheme, building, importId: sent.id, alignment, runId, change, visitId: visit.id, mark };
}

/** Two places, everybody who walks, and how to enter as each of them. */
export async function walkWorld(testApp: TestApp) {
  const app = testApp.app();
  const administrator = await anAdministrator();
  const own = await aPlace(testApp, 'own-secret', administrator);
  const foreign = await aPlace(testApp, 'foreign-secret', administrator);
  const invited = await aPerson({ name: 'Invited', password: null });
  const people = new Map<Walker, Person>([
    ['administrator', administrator],
    ['stranger', await aMember(foreign.scheme, ...ROLES)],
  ]);
  for (const role of ROLES) people.set(role, await aMember(own.scheme, role));

  function enter(walker: Walker): Promise<TestAgent> {
    const person = people.get(walker);
    return person === undefined ? visitor(app) : signIn(app, person);
  }
  const entered = new Map<Walker, TestAgent>();
  for (const walker of WALKERS) entered.set(walker, await enter(walker));

  return {
    own,
    foreign,
    invited,
    enter,
    /** The session that a walker keeps for the whole walk. */
    session: (walker: Walker): TestAgent => {
      const agent = entered.get(walker);
      if (agent === undefined) throw new Error(`Nobody walks as ${walker}.`);
      return agent;
    },
  };
}
