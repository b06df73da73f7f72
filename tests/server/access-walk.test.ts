import type { Response } from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { beforeAll, describe, expect, test } from 'vitest';
import { ROLES } from '../../shared/schemas/roles.ts';
import { schemePolicy, type SchemeAction } from '../../server/policies/scheme-policy.ts';
import type { Route } from '../../server/routes/define-route.ts';
import { ROUTES } from '../../server/routes/index.ts';
import { testApp } from '../support/test-app.ts';
import { UNKNOWN_ID, UNKNOWN_NUMBER } from '../support/unknown-ids.ts';
import { WALKERS, walkWorld, type Place, type Walker } from '../support/walk-world.ts';

const walked = testApp();
let world: Awaited<ReturnType<typeof walkWorld>>;

beforeAll(async () => {
  world = await walkWorld(walked);
});

/** What a refusal and what a step that may be taken are answered with; the latter may lack a good form. */
const REFUSED = [401, 403, 404];
const TAKEN = [200, 201, 202, 204, 307, 409, 410, 415, 422];

type Params = Readonly<Record<string, string | number>>;

/** A value for every parameter there is; a route with a new one has to be thought of here. */
function paramsOf(place: Place | undefined): Params {
  return {
    schemeId: place?.scheme.id ?? UNKNOWN_ID,
    buildingId: place?.building.id ?? UNKNOWN_NUMBER,
    personId: world.invited.id,
    layer: 'rail',
    version: 1,
    z: 14,
    x: 8328,
    y: 5190,
    code: 32631,
    token: 'no-such-token',
    letterId: UNKNOWN_NUMBER,
    changeId: place?.change.id ?? UNKNOWN_ID,
    viewId: UNKNOWN_ID,
    alignmentId: place?.alignment.id ?? UNKNOWN_ID,
    runId: place?.runId ?? UNKNOWN_ID,
    importId: place?.importId ?? UNKNOWN_ID,
    decisionId: UNKNOWN_ID,
    measureId: UNKNOWN_ID,
    matterId: UNKNOWN_ID,
    matterPhotographId: UNKNOWN_ID,
    appointmentId: UNKNOWN_ID,
    undertakingId: UNKNOWN_ID,
    batchId: UNKNOWN_ID,
    writtenLetterId: UNKNOWN_ID,
    letterKind: 'first information',
    partyId: UNKNOWN_ID,
    partyImportId: UNKNOWN_ID,
    visitId: place?.visitId ?? UNKNOWN_ID,
    ownLetterId: UNKNOWN_ID,
    photographId: UNKNOWN_ID,
    layoutId: UNKNOWN_ID,
    printId: UNKNOWN_ID,
    row: 1,
    field: 'use',
  };
}

function addressOf({ path }: Route, params: Params): string {
  return path.replaceAll(/:(\w+)/g, (_, name: string) => {
    const value = params[name];
    if (value === undefined) throw new Error(`The walk does not know what :${name} is.`);
    return String(value);
  });
}

/** Parts of an address that stand for things which are not there in the walk. */
const NOT_THERE = [
  ...['viewId', 'row', 'photographId', 'decisionId', 'measureId', 'ownLetterId', 'batchId'],
  ...['writtenLetterId', 'matterId', 'appointmentId', 'undertakingId', 'partyId', 'partyImportId'],
  ...['layoutId', 'printId'],
];
const OF_NOTHING = new RegExp(`:(${NOT_THERE.join('|')})\\b|/decisions$`);

/** Kept views are of one person each; nothing is mended, decided, written or photographed here. */
function taken({ path }: Route): readonly number[] {
  return OF_NOTHING.test(path) ? [...TAKEN, 404] : TAKEN;
}

/** Takes a step with an empty form, which changes nothing, and tells what came back. */
function step(agent: TestAgent, route: Route, params: Params): Promise<Response> {
  const request = agent[route.method](addressOf(route, params)).redirects(0);
  return Promise.resolve(route.method === 'get' ? request : request.send({}));
}

function actionOf({ access }: Route): SchemeAction | undefined {
  return typeof access === 'object' ? access.scheme : undefined;
}

/** Whether the policy lets a walker do this where the walker has a part. */
function may(walker: Walker, action: SchemeAction): boolean {
  const roles = new Set(ROLES.filter((role) => walker === role || walker === 'stranger'));
  return schemePolicy[action]({ id: walker, isAdministrator: walker === 'administrator', roles });
}

/** The status of a refusal, or undefined where the step may be taken. */
function expected(walker: Walker, action: SchemeAction, place: Place | undefined) {
  if (walker === 'nobody') return 401;
  if (place === undefined) return 404;
  const home = walker === 'stranger' ? world.foreign : world.own;
  if (walker !== 'administrator' && place !== home) return 404;
  return may(walker, action) ? undefined : 403;
}

/** What must not stand in an answer to a walker. */
function hiddenFrom(walker: Walker): string[] {
  const { own, foreign } = world;
  if (walker === 'administrator') return [];
  const places = walker === 'nobody' ? [own, foreign] : [walker === 'stranger' ? own : foreign];
  return places.flatMap(({ mark, scheme }) => [mark, scheme.id]);
}

function expectNothingLeaks(walker: Walker, { status, text, headers }: Response): void {
  const hidden = REFUSED.includes(status) ? ['secret', '@example.org'] : hiddenFrom(walker);
  const answer = `${text} ${JSON.stringify(headers)}`;
  for (const word of hidden) expect(answer).not.toContain(word);
}

const ALL = ROUTES.map((route) => ({ name: `${route.method} ${route.path}`, route }));
const OF_SCHEMES = ALL.filter(({ route }) => actionOf(route) !== undefined);
const OTHERS = ALL.filter(({ route }) => actionOf(route) === undefined);
/** Ending sessions ends the walk, so it comes last. */
const LAST = OTHERS.filter(({ route }) => route.method === 'delete');
const FIRST = OTHERS.filter(({ route }) => route.method !== 'delete');

describe.each(OF_SCHEMES)('$name', ({ route }) => {
  const action = actionOf(route) ?? 'readScheme';

  test.each(WALKERS)('to %s', async (walker) => {
    const agent = world.session(walker);
    const answers = new Map<Place | undefined, Response>();
    for (const place of [world.own, world.foreign, undefined]) {
      const answer = await step(agent, route, paramsOf(place));
      answers.set(place, answer);
      expectNothingLeaks(walker, answer);
      const refusal = expected(walker, action, place);
      if (refusal === undefined) expect(taken(route)).toContain(answer.status);
      else expect([place?.mark, answer.status]).toEqual([place?.mark, refusal]);
    }
    const away = walker === 'stranger' ? world.own : world.foreign;
    const [closed, unknown] = [answers.get(away), answers.get(undefined)];
    if (walker === 'administrator') return;
    expect(closed?.text).toBe(unknown?.text);
    expect(closed?.headers['content-type']).toBe(unknown?.headers['content-type']);
  });
});

describe('a building of another scheme', () => {
  const routes = OF_SCHEMES.filter(({ name }) => name.includes(':buildingId'));

  test.each(routes)('at $name answers like one that is not there', async ({ route }) => {
    for (const walker of WALKERS) {
      const params = paramsOf(world.own);
      const [foreign, unknown] = await Promise.all(
        [world.foreign.building.id, UNKNOWN_NUMBER].map((buildingId) =>
          step(world.session(walker), route, { ...params, buildingId }),
        ),
      );
      expect([walker, foreign?.status]).toEqual([walker, unknown?.status]);
      // a form that is not right is refused before anything is looked up
      expect([...REFUSED, 422]).toContain(foreign?.status);
      expect(foreign?.text).toBe(unknown?.text);
    }
  });
});

describe('every route', () => {
  test('of a scheme asks the policy of schemes, and no other does', () => {
    for (const { name, route } of ALL) {
      expect([name, actionOf(route) !== undefined]).toEqual([name, name.includes(':schemeId')]);
    }
  });

  test('that changes something wants the CSRF token', async () => {
    const agent = await world.enter('administrator');
    agent.set('X-CSRF-Token', 'a guess');
    for (const { name, route } of ALL) {
      if (route.method === 'get') continue;
      const answer = await step(agent, route, paramsOf(world.own));
      expect([name, answer.body]).toMatchObject([name, { error: { code: 'csrf-failed' } }]);
    }
  });

  test('is walked, and one that is not there says so', async () => {
    expect(ALL.length).toBeGreaterThan(30);
    for (const address of ['/api/no-such-thing', '/api/schemes/%E0%A4%A']) {
      expect((await world.session('administrator').get(address)).status).toBe(404);
    }
  });
});

describe.each([...FIRST, ...LAST])('$name', ({ route }) => {
  const { access } = route;
  test.each(WALKERS)('to %s', async (walker) => {
    const agent = route.method === 'delete' ? await world.enter(walker) : world.session(walker);
    const answer = await step(agent, route, paramsOf(world.own));
    expectNothingLeaks(walker, answer);
    if (access !== 'anyone' && walker === 'nobody') expect(answer.status).toBe(401);
    else if (access === 'administrator' && walker !== 'administrator') {
      expect(answer.status).toBe(403);
    } else if (route.path.includes(':letterId')) expect(answer.status).toBe(404);
    else expect(TAKEN).toContain(answer.status);
  });
});
