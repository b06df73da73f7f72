import type TestAgent from 'supertest/lib/agent.js';
import { beforeAll, describe, expect, test } from 'vitest';
import { ROLES, type Role } from '../../../shared/schemas/roles.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { schemePolicy } from '../../../server/policies/scheme-policy.ts';
import type { Route } from '../../../server/routes/define-route.ts';
import { ROUTES } from '../../../server/routes/index.ts';
import { aMember, anAdministrator, aPerson, aScheme } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();
const NOTHING = '3fa85f64-5717-4562-b3fc-2c963f66afa6';
/** What anybody may call. A route comes onto this list only with a reason. */
const OPEN = [
  'get /api/session',
  'post /api/session',
  'post /api/password-resets',
  'get /api/links/:token',
  'post /api/links/:token',
];

let scheme: Scheme;
let foreign: Scheme;
let nobody: TestAgent;
let stranger: TestAgent;
const members = new Map<Role, TestAgent>();

beforeAll(async () => {
  scheme = await aScheme();
  foreign = await aScheme();
  nobody = await visitor(app());
  stranger = await signIn(app(), await aPerson());
  for (const role of ROLES) members.set(role, await signIn(app(), await aMember(scheme, role)));
});

const titleOf = ({ method, path }: Route) => `${method} ${path}`;
const ALL = ROUTES.map((route) => [titleOf(route), route] as const);
const CLOSED = ALL.filter(([, { access }]) => access !== 'anyone');
const ADMINISTRATORS = ALL.filter(([, { access }]) => access === 'administrator');
const SCHEMES = ALL.flatMap(([title, route]) =>
  typeof route.access === 'object' ? [[title, route, route.access.scheme] as const] : [],
);

/** Calls a route in a scheme, with ids that are nobody's for the rest. */
function call(agent: TestAgent, { method, path }: Route, schemeId: string) {
  const address = path.replace(':schemeId', schemeId).replaceAll(/:\w+/g, NOTHING);
  return agent[method](address);
}

test('only these are open', () => {
  const open = ALL.filter(([, { access }]) => access === 'anyone').map(([title]) => title);
  expect(open).toEqual(OPEN);
});

test('no route is declared twice', () => {
  const titles = ALL.map(([title]) => title);
  expect(titles).toEqual([...new Set(titles)]);
});

test('every route in a scheme asks the policy of schemes', () => {
  const within = ALL.filter(([, { path }]) => path.includes(':schemeId'));
  expect(within.map(([title]) => title)).toEqual(SCHEMES.map(([title]) => title));
});

describe.each(CLOSED)('%s', (_title, route) => {
  test('asks for a person before anything else', async () => {
    for (const schemeId of [scheme.id, NOTHING, 'x']) {
      const answer = await call(nobody, route, schemeId);
      expect(answer.status).toBe(401);
      expect(answer.body).toMatchObject({ error: { code: 'not-signed-in' } });
    }
  });
});

describe.each(ADMINISTRATORS)('%s', (_title, route) => {
  test.each(ROLES)('is not for the %s', async (role) => {
    const agent = members.get(role) ?? nobody;
    expect((await call(agent, route, scheme.id)).status).toBe(403);
  });

  test('is for the administrator', async () => {
    const agent = await signIn(app(), await anAdministrator());
    expect([401, 403]).not.toContain((await call(agent, route, scheme.id)).status);
  });
});

describe.each(SCHEMES)('%s', (_title, route, action) => {
  test('answers alike for a foreign scheme and for none', async () => {
    const agents = [stranger, ...members.values()];
    for (const agent of agents) {
      const [other, none] = [
        await call(agent, route, foreign.id),
        await call(agent, route, NOTHING),
      ];
      expect(other.status).toBe(404);
      expect([none.status, none.text]).toEqual([other.status, other.text]);
      expect((await call(agent, route, 'x')).text).toBe(other.text);
    }
  });

  test.each(ROLES)('lets the %s in only where the policy does', async (role) => {
    const actor = { id: '', isAdministrator: false, roles: new Set([role]) };
    const answer = await call(members.get(role) ?? nobody, route, scheme.id);
    if (schemePolicy[action](actor)) expect([401, 403]).not.toContain(answer.status);
    else expect(answer.status).toBe(403);
    expect(answer.status).toBeLessThan(500);
  });
});
