import { randomUUID } from 'node:crypto';
import { beforeEach, describe, expect, test } from 'vitest';
import { QueryTypes } from 'sequelize';
import { ownMatterSchema, ownMattersSchema } from '../../../shared/schemas/matter-answers.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aBuilding, aMember, aScheme } from '../../support/factories.ts';
import { aMatter, aSignedInOwner } from '../../support/matters.ts';
import { aJpeg, aPng, SECRET_PLACE } from '../../support/photographs.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID, UNKNOWN_NUMBER } from '../../support/unknown-ids.ts';

const running = testApp();
const { app, services, outbox, letters } = running;

type Owner = Awaited<ReturnType<typeof aSignedInOwner>>;

let scheme: Scheme;
let owner: Owner;
let neighbour: Owner;
let address: string;

beforeEach(async () => {
  scheme = await aScheme();
  owner = await aSignedInOwner(running, scheme);
  neighbour = await aSignedInOwner(running, scheme, { name: 'Neighbour', email: 'n@example.org' });
  address = `/api/schemes/${scheme.id}/own/matters`;
});

async function sentTo(email: string) {
  await outbox().idle();
  return letters.filter(({ to }) => to === email);
}

describe('bringing something up', () => {
  test('keeps it under the next number, with a day, and confirms it by mail', async () => {
    const matter = aMatter(owner.building.id, { title: 'Crack <b>' });
    const answer = await owner.agent.post(address).send(matter);
    expect(answer.status).toBe(201);
    const own = ownMatterSchema.parse(answer.body);
    expect(own).toMatchObject({ id: matter.id, kind: 'concern', state: 'open' });
    expect(own.messages).toMatchObject([{ id: matter.id, side: 'owner', text: matter.text }]);
    const [row] = await services().database.query(
      'select party_id, opened_by, due > current_date as later from matters where id = $1',
      { type: QueryTypes.SELECT, bind: [matter.id] },
    );
    expect(row).toEqual({ party_id: owner.party.id, opened_by: owner.person.id, later: true });
    const [mail] = await sentTo(owner.person.email);
    const day = new Intl.DateTimeFormat('en-GB', { weekday: 'long', day: 'numeric', month: 'long', timeZone: 'UTC' }); // prettier-ignore
    const due = day.format(new Date(own.due)).replace(',', '');
    expect(mail?.text).toContain(`Thank you. Someone will answer by ${due}.`);
    expect(mail?.text).toContain(`http://127.0.0.1:4600/schemes/${scheme.id}/home`);
    expect(mail?.subject).toContain('Crack <b>');
    const entry = await AuditEntry.findOne({ where: { subjectId: matter.id }, rejectOnEmpty: true }); // prettier-ignore
    expect(entry).toMatchObject({ action: 'bring up matter', after: { number: 1 } });
    expect(JSON.stringify(entry)).not.toContain('It is new');
  });

  test('twice brings it up once and mails once; something else under its number is refused', async () => {
    const matter = aMatter(owner.building.id);
    await owner.agent.post(address).send(matter);
    const again = await owner.agent.post(address).send(matter);
    expect([again.status, again.body]).toMatchObject([200, { state: 'open' }]);
    expect(await sentTo(owner.person.email)).toHaveLength(1);
    const other = { ...matter, text: 'Something else.' };
    expect((await owner.agent.post(address).send(other)).status).toBe(409);
    const theirs = aMatter(neighbour.building.id, { id: matter.id });
    expect((await neighbour.agent.post(address).send(theirs)).status).toBe(409);
    const list = ownMattersSchema.parse((await owner.agent.get(address)).body);
    expect(list.map(({ messages }) => messages[0]?.text)).toEqual([matter.text]);
  });

  test('keeps what the register said beside a correction', async () => {
    const suggestion = { field: 'storeys', value: 3 } as const;
    const matter = aMatter(owner.building.id, { kind: 'correction', suggestion });
    const answer = await owner.agent.post(address).send(matter);
    const kept = { field: 'storeys', value: 3, was: 2, isTakenOver: false };
    expect(answer.body).toMatchObject({ suggestion: kept });
  });

  test.each([
    ['no title', { title: ' ' }],
    ['no text', { text: '' }],
    ['a text that is too long', { text: 'x'.repeat(5001) }],
    ['a correction that suggests nothing', { kind: 'correction' }],
    ['a question that suggests', { kind: 'question', suggestion: { field: 'use', value: 'shop' } }],
    ['words for a number', { kind: 'correction', suggestion: { field: 'storeys', value: 'two' } }],
    ['nothing suggested', { kind: 'correction', suggestion: { field: 'use', value: ' ' } }],
    ['a field that is not theirs', { kind: 'correction', suggestion: { field: 'eOverG', value: 2 } }], // prettier-ignore
    ['eleven photographs', { photographs: Array.from({ length: 11 }, () => ({ id: randomUUID(), caption: '' })) }], // prettier-ignore
  ])('is refused with %s', async (_, wrong) => {
    const answer = await owner.agent
      .post(address)
      .send({ ...aMatter(owner.building.id), ...wrong });
    expect(answer.status).toBe(422);
  });

  test('at a building that is not theirs answers like at one that is not there', async () => {
    const gone = await aBuilding(scheme, { removedAt: new Date() });
    const answers = [];
    for (const id of [UNKNOWN_NUMBER, neighbour.building.id, gone.id]) {
      answers.push(await owner.agent.post(address).send(aMatter(id)));
    }
    expect(answers.map(({ status }) => status)).toEqual([404, 404, 404]);
    expect(new Set(answers.map(({ text }) => text)).size).toBe(1);
  });
});

describe('an interest', () => {
  test.each([
    ['is over', null, '2020-01-01', 404],
    ['has not begun', '2999-01-01', null, 404],
    ['holds today', '2020-01-01', '2999-01-01', 201],
  ])('that %s', async (_, from, to, status) => {
    const { id } = await aBuilding(scheme);
    const interest = { buildingId: id, kind: 'tenant', from, to } as const;
    const tenant = await aSignedInOwner(running, scheme, { interests: [interest] });
    expect((await tenant.agent.post(address).send(aMatter(id))).status).toBe(status);
  });

  test('of somebody whom they represent is theirs too', async () => {
    const agentOfOwner = await aSignedInOwner(running, scheme, {
      name: 'Agents',
      email: 'a@example.org',
    });
    const values = { representedBy: agentOfOwner.party.id, name: 'Represented' };
    const represented = await aSignedInOwner(running, scheme, values);
    const matter = aMatter(represented.building.id);
    expect((await agentOfOwner.agent.post(address).send(matter)).status).toBe(201);
    expect(ownMattersSchema.parse((await represented.agent.get(address)).body)).toHaveLength(1);
    expect(ownMattersSchema.parse((await neighbour.agent.get(address)).body)).toEqual([]);
  });
});

describe('adding to what was brought up', () => {
  test('opens it again with a new day, once, and confirms it', async () => {
    const matter = aMatter(owner.building.id);
    await owner.agent.post(address).send(matter);
    const bind = [matter.id];
    await services().database.query(
      `update matters set state = 'closed', due = '2020-01-01' where id = $1`,
      { bind },
    );
    const message = { id: randomUUID(), text: 'It has grown.', photographs: [] };
    const added = await owner.agent.post(`${address}/${matter.id}/messages`).send(message);
    expect([added.status, added.body]).toMatchObject([201, { state: 'open' }]);
    const again = await owner.agent.post(`${address}/${matter.id}/messages`).send(message);
    expect(again.status).toBe(200);
    const own = ownMatterSchema.parse(again.body);
    expect(own.messages.map(({ text }) => text)).toEqual([matter.text, 'It has grown.']);
    expect(own.due > '2021').toBe(true);
    expect(await sentTo(owner.person.email)).toHaveLength(2);
  });

  test('late says that the answer is late', async () => {
    const matter = aMatter(owner.building.id);
    await owner.agent.post(address).send(matter);
    const bind = [matter.id];
    await services().database.query(`update matters set due = '2020-01-01' where id = $1`, { bind }); // prettier-ignore
    const message = { id: randomUUID(), text: 'Hello?', photographs: [] };
    await owner.agent.post(`${address}/${matter.id}/messages`).send(message);
    const [, second] = await sentTo(owner.person.email);
    expect(second?.text).toContain('Our answer to you is late, and we are sorry.');
  });

  test('to somebody else’s answers like to what is not there', async () => {
    const matter = aMatter(neighbour.building.id);
    await neighbour.agent.post(address).send(matter);
    const message = { id: randomUUID(), text: 'Mine?', photographs: [] };
    const foreign = await owner.agent.post(`${address}/${matter.id}/messages`).send(message);
    const unknown = await owner.agent.post(`${address}/${UNKNOWN_ID}/messages`).send(message);
    expect([foreign.status, unknown.status]).toEqual([404, 404]);
    expect(foreign.text).toBe(unknown.text);
    expect((await owner.agent.post(`${address}/${matter.id}/messages`).send({})).status).toBe(422);
  });
});

describe('a photograph', () => {
  async function announced(who: Owner): Promise<string> {
    const photograph = { id: randomUUID(), caption: 'Over the door' };
    const matter = aMatter(who.building.id, { photographs: [photograph] });
    await who.agent.post(address).send(matter);
    return `${address}/${matter.id}/photographs/${photograph.id}`;
  }

  test('arrives without its place, once, and is read by its owner and the team', async () => {
    const place = await announced(owner);
    const bytes = aJpeg();
    const kept = await owner.agent.put(place).attach('file', bytes, 'photo.jpg');
    expect([kept.status, kept.body]).toMatchObject([200, { type: 'image/jpeg' }]);
    expect((await owner.agent.put(place).attach('file', bytes, 'photo.jpg')).status).toBe(200);
    const other = await owner.agent.put(place).attach('file', aPng({ width: 5 }), 'photo.png');
    expect(other.status).toBe(409);
    const seen = await owner.agent.get(place).buffer();
    expect([seen.status, seen.headers['content-type']]).toEqual([200, 'image/jpeg']);
    expect(Buffer.from(seen.body as Uint8Array).includes(SECRET_PLACE)).toBe(false);
    const list = ownMattersSchema.parse((await owner.agent.get(address)).body);
    expect(list[0]?.messages[0]?.photographs).toMatchObject([{ hasArrived: true }]);
    const assessor = await signIn(app(), await aMember(scheme, 'assessor'));
    expect((await assessor.get(place.replace('/own', ''))).status).toBe(200);
    const witness = await signIn(app(), await aMember(scheme, 'witness'));
    expect((await witness.get(place.replace('/own', ''))).status).toBe(403);
  });

  test('of somebody else answers like one that is not there', async () => {
    const place = await announced(neighbour);
    await neighbour.agent.put(place).attach('file', aJpeg(), 'photo.jpg');
    const unknown = place.replace(/[^/]+$/, UNKNOWN_ID);
    const [foreign, none] = [await owner.agent.get(place), await owner.agent.get(unknown)];
    expect([foreign.status, none.status]).toEqual([404, 404]);
    expect(foreign.text).toBe(none.text);
    expect((await owner.agent.put(place).attach('file', aJpeg(), 'photo.jpg')).status).toBe(404);
  });

  test('is a photograph', async () => {
    const place = await announced(owner);
    const page = Buffer.from('<!doctype html><script>alert(1)</script>');
    expect((await owner.agent.put(place).attach('file', page, 'photo.jpg')).status).toBe(422);
  });
});

test('is for owners alone', async () => {
  const matter = aMatter(owner.building.id);
  expect((await (await visitor(app())).get(address)).status).toBe(401);
  expect((await (await visitor(app())).post(address).send(matter)).status).toBe(401);
  const assessor = await signIn(app(), await aMember(scheme, 'assessor'));
  expect((await assessor.get(address)).status).toBe(403);
  expect((await assessor.post(address).send(matter)).status).toBe(403);
  const stranger = await signIn(app(), await aMember(await aScheme(), 'owner'));
  expect((await stranger.get(address)).status).toBe(404);
});
