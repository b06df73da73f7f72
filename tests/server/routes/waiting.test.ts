import request from 'supertest';
import { expect, test } from 'vitest';
import { waitingSchema, type WaitingAnswer } from '../../../shared/schemas/waiting.ts';
import { BackgroundFeature } from '../../../server/models/background-feature.ts';
import type { Person } from '../../../server/models/person.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import {
  aBuilding,
  aMember,
  aMembership,
  anAdministrator,
  aPerson,
  aScheme,
} from '../../support/factories.ts';
import { aMatter, aSignedInOwner } from '../../support/matters.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const running = testApp();
const { app } = running;

async function waitingFor(person: Person): Promise<WaitingAnswer> {
  const answer = await (await signIn(app(), person)).get('/api/waiting');
  expect(answer.status).toBe(200);
  return waitingSchema.parse(answer.body);
}

async function waitingIn(scheme: Scheme, person: Person) {
  const { schemes } = await waitingFor(person);
  return schemes.find((one) => one.scheme.id === scheme.id)?.waiting;
}

async function withBackground(scheme: Scheme): Promise<void> {
  const geometry = { type: 'Polygon', coordinates: [] };
  const box = { west: 3, south: 54, east: 3.1, north: 54.1 };
  await BackgroundFeature.create({ schemeId: scheme.id, layer: 'parks', name: null, geometry, ...box }); // prettier-ignore
}

test('lists the schemes that a person has a part in, with their roles', async () => {
  const [one, other] = [await aScheme({ name: 'B' }), await aScheme({ name: 'A' })];
  await aScheme({ name: 'C' });
  const person = await aMember(one, 'witness', 'owner');
  await aMembership(other, person, 'owner');
  const { general, schemes } = await waitingFor(person);
  expect(general).toEqual([]);
  expect(schemes).toEqual([
    { scheme: { id: other.id, name: 'A', archivedAt: null }, roles: ['owner'], waiting: [] },
    {
      scheme: { id: one.id, name: 'B', archivedAt: null },
      roles: ['owner', 'witness'],
      waiting: [],
    },
  ]);
});

test('an assessor waits for buildings and for a map until they are there', async () => {
  const scheme = await aScheme();
  const assessor = await aMember(scheme, 'assessor');
  const since = scheme.createdAt.toISOString();
  expect(await waitingIn(scheme, assessor)).toEqual([
    {
      kind: 'no-buildings',
      count: 1,
      text: 'The register has no buildings yet.',
      since,
      link: `/schemes/${scheme.id}/plan`,
    },
    {
      kind: 'no-background',
      count: 1,
      text: 'The map has no streets, water, rail or parks yet.',
      since,
      link: `/schemes/${scheme.id}/settings/background`,
    },
  ]);
  await withBackground(scheme);
  expect(await waitingIn(scheme, assessor)).toMatchObject([{ kind: 'no-buildings' }]);
  await aBuilding(scheme);
  expect(await waitingIn(scheme, assessor)).toEqual([]);
});

test('a designer waits for a map only', async () => {
  const scheme = await aScheme();
  const designer = await aMember(scheme, 'designer');
  expect(await waitingIn(scheme, designer)).toMatchObject([{ kind: 'no-background' }]);
});

test('the administrator waits for people', async () => {
  const scheme = await aScheme();
  await withBackground(scheme);
  const administrator = await anAdministrator();
  const link = `/schemes/${scheme.id}/settings/people`;
  expect(await waitingIn(scheme, administrator)).toMatchObject([
    {
      kind: 'roles-not-filled',
      count: 3,
      text: 'Nobody is designer, assessor or witness yet.',
      link,
    },
  ]);
  const invited = await aPerson({ password: null });
  await aMembership(scheme, invited, 'designer', 'assessor');
  await aMember(scheme, 'owner');
  await aMembership(scheme, await aPerson({ password: null }), 'owner');
  expect(await waitingIn(scheme, administrator)).toMatchObject([
    { kind: 'roles-not-filled', count: 1, text: 'Nobody is witness yet.' },
    {
      kind: 'invitations-not-accepted',
      count: 2,
      text: 'Invitations not accepted yet.',
      since: invited.createdAt.toISOString(),
      link,
    },
  ]);
});

test('the administrator sees invitations of people who are in no scheme, others do not', async () => {
  const invited = await aPerson({ password: null });
  const { general } = await waitingFor(await anAdministrator());
  expect(general).toEqual([
    {
      kind: 'invitations-not-accepted',
      count: 1,
      text: 'Invitation not accepted yet.',
      since: invited.createdAt.toISOString(),
      link: '/people',
    },
  ]);
  expect((await waitingFor(await aPerson())).general).toEqual([]);
});

test('nothing waits in an archived scheme, and whoever holds several roles is told once', async () => {
  const archived = await aScheme({ archivedAt: new Date() });
  const scheme = await aScheme();
  const person = await aMember(scheme, 'designer', 'assessor');
  await aMembership(archived, person, 'assessor');
  expect(await waitingIn(archived, person)).toEqual([]);
  const kinds = (await waitingIn(scheme, person))?.map(({ kind }) => kind);
  expect(kinds).toEqual(['no-buildings', 'no-background']);
});

test('an assessor waits for what owners brought up and for what is overdue, a witness does not', async () => {
  const scheme = await aScheme();
  await withBackground(scheme);
  const owner = await aSignedInOwner(running, scheme);
  const assessor = await aMember(scheme, 'assessor');
  const other = await aMember(scheme, 'assessor');
  const own = `/api/schemes/${scheme.id}/own/matters`;
  await owner.agent.post(own).send(aMatter(owner.building.id));
  const theirs = aMatter(owner.building.id);
  await owner.agent.post(own).send(theirs);
  const agent = await signIn(app(), other);
  const given = { version: 1, assignedTo: other.id };
  await agent.patch(`/api/schemes/${scheme.id}/matters/${theirs.id}`).send(given);
  await agent.post(`/api/schemes/${scheme.id}/undertakings`).send({
    ...{ promise: 'Quiet nights', madeTo: 'Council', partyId: null, source: 'Hearing' },
    ...{ buildingId: owner.building.id, stretch: null, due: '2020-01-01' },
    ...{ responsible: 'Site', doneOn: null, evidence: '' },
  });
  expect(await waitingIn(scheme, assessor)).toMatchObject([
    { kind: 'matters-waiting', count: 1, link: `/schemes/${scheme.id}/owners/inbox` },
    { kind: 'undertakings-overdue', count: 1, since: '2020-01-01T00:00:00.000Z' },
  ]);
  expect(await waitingIn(scheme, other)).toMatchObject([{ count: 2 }, { count: 1 }]);
  expect(await waitingIn(scheme, await aMember(scheme, 'witness'))).toEqual([]);
});

test('is for people who are signed in', async () => {
  expect((await request(app()).get('/api/waiting')).status).toBe(401);
});
