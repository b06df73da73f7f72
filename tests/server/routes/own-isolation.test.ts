import { randomUUID } from 'node:crypto';
import type { Response } from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { beforeAll, describe, expect, test } from 'vitest';
import { Alignment } from '../../../server/models/alignment.ts';
import { schemePolicy, type SchemeAction } from '../../../server/policies/scheme-policy.ts';
import type { Route } from '../../../server/routes/define-route.ts';
import { ROUTES } from '../../../server/routes/index.ts';
import { aMember } from '../../support/factories.ts';
import { anOwner, someLetters } from '../../support/owners.ts';
import { aJpeg } from '../../support/photographs.ts';
import { registered } from '../../support/register.ts';
import { aRun, aTownToRun } from '../../support/runs.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const tested = testApp();

/** Stands in everything that is not the owner's own: references, names, addresses, parties, words. */
const FOREIGN = 'Xfremd';

type Params = Readonly<Record<string, string | number>>;

/** Brings up a question with a photograph, and gives the numbers of both. */
async function aQuestion(agent: TestAgent, schemeId: string, buildingId: number, words: string) {
  const [matterId, matterPhotographId] = [randomUUID(), randomUUID()];
  const address = `/api/schemes/${schemeId}/own/matters`;
  const asked = await agent.post(address).send({
    ...{ id: matterId, buildingId, kind: 'concern', title: words, text: words },
    ...{ suggestion: null, photographs: [{ id: matterPhotographId, caption: words }] },
  });
  if (asked.status !== 201) throw new Error(`Asking was answered by ${asked.text}.`);
  const sent = await agent
    .put(`${address}/${matterId}/photographs/${matterPhotographId}`)
    .attach('file', aJpeg({ words }), 'photograph.jpg');
  if (sent.status !== 200) throw new Error(`A photograph was answered by ${sent.text}.`);
  return { matterId, matterPhotographId };
}

async function anAppointment(
  agent: TestAgent,
  schemeId: string,
  at: { readonly buildingId: number; readonly partyId: string; readonly place: string },
) {
  const id = randomUUID();
  const answer = await agent.post(`/api/schemes/${schemeId}/appointments`).send({
    ...{ id, ...at, purpose: 'condition survey', minutes: 60, isFreeDayMeant: true },
    startsAt: new Date(Date.now() + 30 * 86_400_000).toISOString(),
  });
  if (answer.status !== 201) throw new Error(`An appointment was answered by ${answer.text}.`);
  return id;
}

/** A scheme in which one owner has a house, and everything else is marked as somebody else's. */
async function aWorld() {
  const { scheme, option } = await aTownToRun();
  const [mine, theirs, ...others] = await registered(scheme);
  if (mine === undefined || theirs === undefined) throw new Error('The town is empty.');
  await mine.update({ name: 'Minehouse', address: '1 Mine Lane', use: 'dwelling' });
  for (const one of [theirs, ...others]) {
    const reference = `${FOREIGN}-${one.reference}`;
    await one.update({ reference, name: `${FOREIGN} house`, address: `${FOREIGN} Lane` });
  }
  const run = await aRun(tested, scheme, await Alignment.findByPk(option.id, { rejectOnEmpty: true })); // prettier-ignore
  const ada = await anOwner(scheme, 'Ada Mine', [mine.id]);
  const bob = await anOwner(scheme, `Bob ${FOREIGN}`, [theirs.id]);
  await bob.person.update({ name: `Bob ${FOREIGN}`, email: `${FOREIGN}@example.org` });
  const [own = '', ownLetterId = ''] = await someLetters(scheme, {
    runId: run.id,
    letters: [
      { partyId: ada.partyId, buildings: [mine.id], subject: 'To Ada', parts: ['Dear Ada'] },
      { partyId: bob.partyId, buildings: [theirs.id], subject: FOREIGN, parts: [FOREIGN] },
    ],
  });
  const [ownAgent, foreignAgent, team] = [
    await signIn(tested.app(), ada.person),
    await signIn(tested.app(), bob.person),
    await signIn(tested.app(), await aMember(scheme, 'assessor')),
  ];
  const asked = await aQuestion(foreignAgent, scheme.id, theirs.id, FOREIGN);
  const ofAda = await aQuestion(ownAgent, scheme.id, mine.id, 'A crack of mine');
  const visit = { place: FOREIGN, buildingId: theirs.id, partyId: bob.partyId };
  const foreign: Params = {
    ...{ schemeId: scheme.id, buildingId: theirs.id, partyId: bob.partyId, ownLetterId, ...asked },
    ...{ writtenLetterId: ownLetterId, runId: run.id, alignmentId: option.id },
    ...{ appointmentId: await anAppointment(team, scheme.id, visit), personId: bob.person.id },
    ...{ version: scheme.registerVersion, z: 14, x: 8328, y: 5190, layer: 'streets', code: 32631 },
  };
  const home = { place: 'At home', buildingId: mine.id, partyId: ada.partyId };
  const mineIds: Params = {
    ...{ schemeId: scheme.id, ownLetterId: own, ...ofAda },
    appointmentId: await anAppointment(team, scheme.id, home),
  };
  return { scheme, theirs, bob, ownAgent, foreign, mineIds };
}

let world: Awaited<ReturnType<typeof aWorld>>;

beforeAll(async () => {
  world = await aWorld();
});

function actionOf({ access }: Route): SchemeAction | undefined {
  return typeof access === 'object' ? access.scheme : undefined;
}

function addressOf({ path }: Route, params: Params): string {
  return path.replaceAll(/:(\w+)/g, (_, name: string) => String(params[name] ?? UNKNOWN_ID));
}

function step(route: Route, params: Params): Promise<Response> {
  const request = world.ownAgent[route.method](addressOf(route, params)).redirects(1);
  return Promise.resolve(route.method === 'get' ? request.buffer(true) : request.send({}));
}

/** Everything of an answer that reaches the browser. */
function wholeOf({ text, body, headers }: Response): string {
  const bytes = Buffer.isBuffer(body) ? body.toString('latin1') : '';
  return `${text} ${bytes} ${JSON.stringify(body)} ${JSON.stringify(headers)}`;
}

function expectNothingForeign(answer: Response): void {
  const whole = wholeOf(answer);
  expect(whole).not.toContain(FOREIGN);
  expect(whole).not.toContain(world.bob.partyId);
  expect(whole).not.toContain(world.bob.person.id);
}

const OF_SCHEMES = ROUTES.filter((route) => actionOf(route) !== undefined);
const OTHERS = ROUTES.filter(
  (route) => actionOf(route) === undefined && !(route.method === 'delete' && route.path.includes('session')), // prettier-ignore
);
function named(route: Route) {
  return { name: `${route.method} ${route.path}`, route };
}
const OWN = OF_SCHEMES.filter(({ path }) => path.includes('/own'));

function isOwners(route: Route): boolean {
  const action = actionOf(route);
  const roles = new Set(['owner' as const]);
  return action !== undefined && schemePolicy[action]({ id: '', isAdministrator: false, roles });
}

describe('with the numbers of another owner', () => {
  test.each(OF_SCHEMES.map(named))('$name tells nothing', async ({ route }) => {
    const answer = await step(route, world.foreign);
    expectNothingForeign(answer);
    if (!isOwners(route)) expect(answer.status).toBe(403);
  });

  const TAKES_A_NUMBER = OWN.filter(({ path }) => /:(?!schemeId)/.test(path));
  test.each(TAKES_A_NUMBER.map(named))('$name is not there', async ({ route }) => {
    const answer = await step(route, world.foreign);
    // a form that is not right is refused before anything is looked up
    expect([404, 415, 422]).toContain(answer.status);
    const unknown = await step(route, { ...world.foreign, ...nothing() });
    expect([answer.status, answer.text]).toEqual([unknown.status, unknown.text]);
  });

  test.each(OTHERS.map(named))('$name tells nothing outside of schemes', async ({ route }) => {
    expectNothingForeign(await step(route, world.foreign));
  });
});

function nothing(): Params {
  const names = ['ownLetterId', 'matterId', 'matterPhotographId', 'appointmentId'];
  return Object.fromEntries(names.map((name) => [name, randomUUID()]));
}

describe('with their own numbers', () => {
  const READ = OWN.filter(({ method }) => method === 'get');
  test.each(READ.map(named))(
    '$name is answered, and tells nothing of others',
    async ({ route }) => {
      const answer = await step(route, world.mineIds);
      expect(answer.status).toBe(200);
      expectNothingForeign(answer);
    },
  );

  test('nothing can be brought up at a building of somebody else', async () => {
    const answer = await world.ownAgent.post(`/api/schemes/${world.scheme.id}/own/matters`).send({
      ...{ id: randomUUID(), buildingId: world.theirs.id, kind: 'question', title: 'A' },
      ...{ text: 'B', suggestion: null, photographs: [] },
    });
    expect(answer.status).toBe(404);
    expectNothingForeign(answer);
  });

  test('the walk meets every kind of route', () => {
    expect(OWN.length).toBeGreaterThanOrEqual(11);
    expect(OF_SCHEMES.filter(isOwners).length).toBeGreaterThan(OWN.length);
  });
});

test.each(['/register', '/building-outlines', '/tiles/buildings/1/14/8328/5190.pbf', '/extent'])(
  '%s is asked for and tells an owner nothing of buildings',
  async (path) => {
    const answer = await world.ownAgent.get(`/api/schemes/${world.scheme.id}${path}`);
    expectNothingForeign(answer);
    if (path !== '/extent') expect(answer.status).toBe(403);
  },
);
