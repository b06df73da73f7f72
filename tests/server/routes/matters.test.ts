import { randomUUID } from 'node:crypto';
import type TestAgent from 'supertest/lib/agent.js';
import { beforeEach, describe, expect, test } from 'vitest';
import {
  matterSchema,
  mattersSchema,
  type Matter,
} from '../../../shared/schemas/matter-answers.ts';
import type { NewMatter } from '../../../shared/schemas/matters.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Building } from '../../../server/models/building.ts';
import type { Person } from '../../../server/models/person.ts';
import { RegisterChange } from '../../../server/models/register-change.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { aMatter, aSignedInOwner } from '../../support/matters.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const running = testApp();
const { app, services, outbox, letters } = running;

let scheme: Scheme;
let owner: Awaited<ReturnType<typeof aSignedInOwner>>;
let person: Person;
let assessor: TestAgent;
let address: string;

beforeEach(async () => {
  scheme = await aScheme();
  owner = await aSignedInOwner(running, scheme);
  person = await aMember(scheme, 'assessor');
  assessor = await signIn(app(), person);
  address = `/api/schemes/${scheme.id}/matters`;
});

async function brought(overrides: Partial<NewMatter> = {}): Promise<string> {
  const matter = aMatter(owner.building.id, overrides);
  const answer = await owner.agent.post(`/api/schemes/${scheme.id}/own/matters`).send(matter);
  expect(answer.status).toBe(201);
  return matter.id;
}

async function read(id: string): Promise<Matter> {
  return matterSchema.parse((await assessor.get(`${address}/${id}`)).body);
}

async function found(query: Readonly<Record<string, string>>): Promise<string[]> {
  const { matters, total } = mattersSchema.parse((await assessor.get(address).query(query)).body);
  expect(total).toBe(matters.length);
  return matters.map(({ title }) => title);
}

async function mailsTo(email: string) {
  await outbox().idle();
  return letters.filter(({ to }) => to === email).map(({ text }) => text);
}

function answerTo({ version }: Pick<Matter, 'version'>, text = 'We come on Friday.\nStay calm.') {
  return { id: randomUUID(), version, side: 'team', text } as const;
}

describe('the inbox', () => {
  test('has what is due first at the top, and is filtered', async () => {
    const late = await brought({ title: 'Late', kind: 'claim' });
    await brought({ title: 'A question', kind: 'question', text: 'About 100% sure_ness' });
    const done = await brought({ title: 'Done' });
    const set = 'update matters set due = $2, state = $3 where id = $1';
    const bind = [late, '2020-01-01', 'open'];
    await services().database.query(set, { bind });
    await services().database.query(set, { bind: [done, '2020-01-01', 'closed'] });
    expect(await found({})).toEqual(['Late', 'A question', 'Done']);
    expect(await found({ state: 'closed' })).toEqual(['Done']);
    expect(await found({ kind: 'question' })).toEqual(['A question']);
    expect(await found({ overdue: 'true' })).toEqual(['Late']);
    expect(await found({ text: '100% SURE_' })).toEqual(['A question']);
    expect(await found({ text: '10_% ' })).toEqual([]);
    expect(await found({ text: owner.building.reference, state: 'open' })).toHaveLength(2);
    expect(await found({ building: String(owner.building.id) })).toHaveLength(3);
    expect(await found({ building: '2000000000' })).toEqual([]);
    expect(await found({ mine: 'true' })).toEqual([]);
    const change = { version: 1, assignedTo: person.id };
    await assessor.patch(`${address}/${late}`).send(change);
    expect(await found({ mine: 'true' })).toEqual(['Late']);
    expect((await assessor.get(address).query({ state: 'lost' })).status).toBe(422);
  });
});

describe('an answer', () => {
  test('goes to the owner by mail, once, and the matter is answered', async () => {
    const id = await brought();
    const message = answerTo(await read(id));
    const sent = await assessor.post(`${address}/${id}/messages`).send(message);
    expect([sent.status, sent.body]).toMatchObject([201, { state: 'answered', version: 2 }]);
    expect((await assessor.post(`${address}/${id}/messages`).send(message)).status).toBe(200);
    const mails = await mailsTo(owner.person.email);
    expect(mails).toHaveLength(2);
    expect(mails[1]).toContain('We come on Friday.\n\nStay calm.');
    expect(mails[1]).toContain(`http://127.0.0.1:4600/schemes/${scheme.id}/home`);
    expect(mails[1]).not.toContain(person.name);
    const own = await owner.agent.get(`/api/schemes/${scheme.id}/own/matters`);
    expect(own.text).toContain('We come on Friday.');
    expect(own.text).not.toContain(person.name);
    const entries = await AuditEntry.findAll({ where: { subjectId: id }, order: ['id'] });
    expect(entries.map(({ action }) => action)).toEqual(['bring up matter', 'answer matter']);
  });

  test('past what the owner has added is refused, and so is the second of two', async () => {
    const id = await brought();
    const seen = await read(id);
    const more = { id: randomUUID(), text: 'More.', photographs: [] };
    await owner.agent.post(`/api/schemes/${scheme.id}/own/matters/${id}/messages`).send(more);
    const early = await assessor.post(`${address}/${id}/messages`).send(answerTo(seen));
    expect(early.status).toBe(409);
    const now = await read(id);
    const both = await Promise.all(
      [answerTo(now, 'One'), answerTo(now, 'Other')].map((message) =>
        assessor.post(`${address}/${id}/messages`).send(message),
      ),
    );
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect((await read(id)).messages).toHaveLength(3);
  });

  test('does not go to somebody who may not sign in any more', async () => {
    const id = await brought();
    await owner.person.update({ shutOutAt: new Date() });
    const matter = await read(id);
    expect(matter.isMailed).toBe(false);
    await assessor.post(`${address}/${id}/messages`).send(answerTo(matter));
    expect(await mailsTo(owner.person.email)).toHaveLength(1);
  });

  test('is written', async () => {
    const id = await brought();
    const answer = await assessor.post(`${address}/${id}/messages`).send(answerTo(await read(id), ' ')); // prettier-ignore
    expect(answer.status).toBe(422);
  });
});

test('a note stays inside the team', async () => {
  const id = await brought();
  const note = { ...answerTo(await read(id), 'Call the insurer first.'), side: 'note' };
  const kept = await assessor.post(`${address}/${id}/messages`).send(note);
  expect([kept.status, kept.body]).toMatchObject([201, { state: 'open', version: 1 }]);
  const own = await owner.agent.get(`/api/schemes/${scheme.id}/own/matters`);
  expect(own.text).not.toContain('insurer');
  expect(await mailsTo(owner.person.email)).toHaveLength(1);
});

describe('where a matter stands', () => {
  test('is changed by the first who saw it so, and the trail keeps both', async () => {
    const id = await brought();
    const change = { version: 1, state: 'closed', due: '2027-03-01', assignedTo: person.id };
    const answer = await assessor.patch(`${address}/${id}`).send(change);
    const after = { state: 'closed', due: '2027-03-01', assignedTo: { id: person.id } };
    expect([answer.status, answer.body]).toMatchObject([200, { ...after, version: 2 }]);
    expect((await assessor.patch(`${address}/${id}`).send(change)).status).toBe(409);
    const entry = await AuditEntry.findOne({
      where: { subjectId: id, action: 'change matter' },
      rejectOnEmpty: true,
    });
    expect(entry).toMatchObject({ before: { state: 'open' }, after: { state: 'closed' } });
  });

  test('is given to assessors of the scheme alone', async () => {
    const id = await brought();
    const witness = await aMember(scheme, 'witness');
    const change = { version: 1, assignedTo: witness.id };
    const answer = await assessor.patch(`${address}/${id}`).send(change);
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path: 'assignedTo' }] } });
    expect((await assessor.patch(`${address}/${id}`).send({ version: 1, due: 'soon' })).status).toBe(422); // prettier-ignore
  });
});

describe('taking a correction over', () => {
  const suggestion = { field: 'storeys', value: 3 } as const;

  async function takeOver(id: string, overrides: object = {}) {
    const { version, building } = await read(id);
    const message = { id: randomUUID(), text: 'Thank you, put right.' };
    const asked = { version, buildingVersion: building.version, message, ...overrides };
    return assessor.post(`${address}/${id}/taking-over`).send(asked);
  }

  test('changes the register, answers the owner and closes it, all at once', async () => {
    const id = await brought({ kind: 'correction', suggestion });
    const answer = await takeOver(id);
    expect(answer.status).toBe(200);
    const matter = matterSchema.parse(answer.body);
    expect(matter).toMatchObject({ state: 'closed', suggestion: { isTakenOver: true, was: 2 } });
    const building = await Building.findByPk(owner.building.id, { rejectOnEmpty: true });
    expect(building).toMatchObject({ storeys: 3, version: 2 });
    const change = await RegisterChange.findOne({ where: { schemeId: scheme.id } });
    expect(change).toMatchObject({ kind: 'edit', personId: person.id });
    expect(change?.source).toContain(`matter ${matter.number}`);
    expect((await mailsTo(owner.person.email))[1]).toContain('Thank you, put right.');
    expect((await takeOver(id)).status).toBe(409);
  });

  test('is refused where the building has changed, and changes nothing', async () => {
    const id = await brought({ kind: 'correction', suggestion });
    const { building } = await read(id);
    await assessor
      .patch(`/api/schemes/${scheme.id}/buildings/${building.id}`)
      .send({ version: building.version, attributes: { use: 'shop' } });
    const answer = await takeOver(id, { buildingVersion: building.version });
    expect(answer.status).toBe(409);
    expect((await read(id)).messages).toHaveLength(1);
    expect(await mailsTo(owner.person.email)).toHaveLength(1);
  });

  test('is for corrections', async () => {
    expect((await takeOver(await brought())).status).toBe(404);
  });
});

test('a matter of another scheme is not there, and each step is for those who may', async () => {
  const id = await brought();
  const elsewhere = await signIn(app(), await aMember(await aScheme(), 'assessor'));
  expect((await elsewhere.get(`${address}/${id}`)).status).toBe(404);
  const other = await aScheme();
  const both = await aMember(other, 'assessor');
  const agent = await signIn(app(), both);
  const moved = `/api/schemes/${other.id}/matters/${id}`;
  expect((await agent.get(moved)).status).toBe(404);
  expect((await agent.patch(moved).send({ version: 1, state: 'closed' })).status).toBe(404);
  const message = answerTo({ version: 1 });
  expect((await agent.post(`${moved}/messages`).send(message)).status).toBe(404);
  expect((await (await visitor(app())).get(address)).status).toBe(401);
  const witness = await signIn(app(), await aMember(scheme, 'witness'));
  expect((await witness.get(address)).status).toBe(403);
  expect((await owner.agent.get(`${address}/${id}`)).status).toBe(403);
  const change = { version: 1, state: 'closed' };
  expect((await owner.agent.patch(`${address}/${id}`).send(change)).status).toBe(403);
});
