import { randomUUID } from 'node:crypto';
import type TestAgent from 'supertest/lib/agent.js';
import { beforeEach, describe, expect, test } from 'vitest';
import {
  appointmentSchema,
  appointmentsSchema,
  ownAppointmentsSchema,
  type Appointment,
} from '../../../shared/schemas/appointments.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aBuilding, aMember, anAdministrator, aPerson, aScheme } from '../../support/factories.ts';
import { keepSettings } from '../../support/letters.ts';
import { aSignedInOwner } from '../../support/matters.ts';
import { aParty } from '../../support/parties.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const running = testApp();
const { app, outbox, letters } = running;

let scheme: Scheme;
let owner: Awaited<ReturnType<typeof aSignedInOwner>>;
let assessor: TestAgent;
let address: string;
let own: string;

beforeEach(async () => {
  scheme = await aScheme();
  owner = await aSignedInOwner(running, scheme, { email: `${randomUUID()}@example.org` });
  assessor = await signIn(app(), await aMember(scheme, 'assessor'));
  address = `/api/schemes/${scheme.id}/appointments`;
  own = `/api/schemes/${scheme.id}/own/appointments`;
});

function anAppointment(overrides: object = {}) {
  return {
    id: randomUUID(),
    buildingId: owner.building.id,
    partyId: owner.party.id,
    purpose: 'condition survey',
    startsAt: '2999-06-11T10:00:00+02:00',
    minutes: 90,
    place: 'Front door',
    isFreeDayMeant: false,
    ...overrides,
  };
}

async function offered(overrides: object = {}): Promise<Appointment> {
  const answer = await assessor.post(address).send(anAppointment(overrides));
  expect(answer.status).toBe(201);
  return appointmentSchema.parse(answer.body);
}

async function mails() {
  await outbox().idle();
  return letters.filter(({ to }) => to === owner.party.email);
}

function calendarOf(letter: Awaited<ReturnType<typeof mails>>[number] | undefined): string {
  const [attachment] = letter?.attachments ?? [];
  return String(attachment?.content);
}

test('times are told by the clocks of the scheme, and a calendar gets the instant', async () => {
  const administrator = await signIn(app(), await aPerson({ isAdministrator: true }));
  await keepSettings(administrator, scheme, { timeZone: 'Pacific/Auckland' });
  await offered();
  const [mail] = await mails();
  expect(mail?.text).toContain('When: Tuesday 11 June 2999, 20:00');
  expect(calendarOf(mail)).toContain('DTSTART:29990611T080000Z');
});

describe('an offer', () => {
  test('reaches the party by mail with what their calendar needs, once', async () => {
    const asked = anAppointment();
    const answer = await assessor.post(address).send(asked);
    expect(answer.status).toBe(201);
    const appointment = appointmentSchema.parse(answer.body);
    expect(appointment).toMatchObject({ state: 'offered', isMailed: true, version: 1 });
    expect((await assessor.post(address).send(asked)).status).toBe(200);
    expect((await assessor.post(address).send({ ...asked, minutes: 30 })).status).toBe(409);
    const sent = await mails();
    expect(sent).toHaveLength(1);
    expect(sent[0]?.text).toContain('When: Tuesday 11 June 2999, 08:00');
    expect(sent[0]?.text).toContain('12 Fishgate, Front door');
    expect(sent[0]?.attachments).toMatchObject([
      { filename: 'appointment.ics', contentType: 'text/calendar; charset=utf-8; method=REQUEST' },
    ]);
    const calendar = calendarOf(sent[0]);
    expect(calendar).toContain(`UID:${asked.id}@127.0.0.1\r\nSEQUENCE:1\r\n`);
    expect(calendar).toContain('DTSTART:29990611T080000Z\r\nDTEND:29990611T093000Z\r\n');
    const entry = await AuditEntry.findOne({ where: { subjectId: asked.id }, rejectOnEmpty: true });
    expect(entry).toMatchObject({ action: 'offer appointment', after: { state: 'offered' } });
  });

  test('goes to whoever acts for the party', async () => {
    const values = { name: 'Agents', email: `${randomUUID()}@example.org`, interests: [] };
    const agent = await aParty(assessor, scheme, values);
    const interest = { buildingId: owner.building.id, kind: 'tenant', from: null, to: null } as const; // prettier-ignore
    const party = { name: 'T', representedBy: agent.id, email: 't@example.org', interests: [interest] }; // prettier-ignore
    await offered({ partyId: (await aParty(assessor, scheme, party)).id });
    await outbox().idle();
    expect(letters.filter(({ to }) => to === values.email)).toHaveLength(1);
    expect(letters.filter(({ to }) => to === 't@example.org')).toHaveLength(0);
  });

  test.each([
    ['a time that has passed', { startsAt: '2020-01-01T10:00:00Z' }, 'startsAt'],
    ['no time', { startsAt: 'soon' }, 'startsAt'],
    ['no length', { minutes: 0 }, 'minutes'],
    ['no place', { place: ' ' }, 'place'],
    ['a line break in the place', { place: 'a\r\nATTENDEE:mailto:x@example.org' }, 'place'],
    ['somebody who is not there', { partyId: UNKNOWN_ID }, 'partyId'],
  ])('is refused with %s', async (_, wrong, path) => {
    const answer = await assessor.post(address).send(anAppointment(wrong));
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path }] } });
  });

  test.each([
    ['a Saturday', '2999-06-15T10:00:00Z'],
    ['a Sunday', '2999-06-16T10:00:00Z'],
    ['a day that is a Saturday where the owners are', '2999-06-14T23:30:00Z'],
    ['a holiday', '2999-06-12T10:00:00Z'],
  ])('is refused on %s unless that is meant, and so is another time', async (_, startsAt) => {
    const holidays = [{ date: '2999-06-12', name: 'Founders’ Day' }];
    await keepSettings(await signIn(app(), await anAdministrator()), scheme, { timeZone: 'Europe/Paris', holidays }); // prettier-ignore
    const answer = await assessor.post(address).send(anAppointment({ startsAt }));
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path: 'startsAt' }] } });
    expect(answer.text).toContain('Choose a working day, or say below that this day is meant.');
    const { id } = await offered();
    const anew = { change: 'offer anew', version: 1, startsAt, minutes: 60, place: 'Yard' };
    const change = (isFreeDayMeant: boolean) =>
      assessor.patch(`${address}/${id}`).send({ ...anew, isFreeDayMeant });
    expect((await change(false)).status).toBe(422);
    expect((await change(true)).body).toMatchObject({ state: 'offered', version: 2 });
    expect((await offered({ startsAt, isFreeDayMeant: true })).state).toBe('offered');
  });

  test('is made to those who have a part in the building', async () => {
    const { id } = await aBuilding(scheme);
    const answer = await assessor.post(address).send(anAppointment({ buildingId: id }));
    expect([answer.status, await mails()]).toEqual([422, []]);
  });
});

describe('the owner', () => {
  test('agrees, and both know', async () => {
    const { id } = await offered();
    const list = ownAppointmentsSchema.parse((await owner.agent.get(own)).body);
    expect(list).toMatchObject([{ id, state: 'offered', building: { id: owner.building.id } }]);
    const agreed = { version: 1, answer: 'agree' };
    const answer = await owner.agent.post(`${own}/${id}/answer`).send(agreed);
    expect([answer.status, answer.body]).toMatchObject([200, { state: 'agreed', version: 2 }]);
    expect((await owner.agent.post(`${own}/${id}/answer`).send(agreed)).status).toBe(409);
    await outbox().idle();
    const mail = letters.find(({ to }) => to === owner.person.email);
    expect(mail?.subject).toBe('Our visit is agreed');
    expect(calendarOf(mail)).toContain('SEQUENCE:2\r\n');
    const seen = appointmentsSchema.parse((await assessor.get(address)).body);
    expect(seen).toMatchObject([{ state: 'agreed' }]);
  });

  test('asks for another day, and the team offers it', async () => {
    const { id } = await offered();
    const days = [{ day: '2999-07-01', part: 'morning' }];
    const asked = { version: 1, answer: 'another day', days, note: 'Not on Fridays.' };
    const answer = await owner.agent.post(`${own}/${id}/answer`).send(asked);
    expect(answer.body).toMatchObject({ state: 'another day asked for', askedFor: { days } });
    await outbox().idle();
    const mail = letters.find(({ to }) => to === owner.person.email);
    expect(mail?.text).toContain('Monday 1 July, in the morning');
    const anew = { change: 'offer anew', startsAt: '2999-07-01T09:00:00Z', minutes: 60, place: 'Yard', isFreeDayMeant: false }; // prettier-ignore
    const changed = await assessor.patch(`${address}/${id}`).send({ ...anew, version: 2 });
    expect(changed.body).toMatchObject({ state: 'offered', askedFor: null, version: 3 });
    expect((await assessor.patch(`${address}/${id}`).send({ ...anew, version: 2 })).status).toBe(409); // prettier-ignore
    const sent = await mails();
    expect(sent[1]?.text).toContain('Monday 1 July 2999, 09:00');
  });

  test.each([
    ['no day', []],
    ['a day that has passed', [{ day: '2020-01-01', part: 'morning' }]],
    ['four days', ['01', '02', '03', '04'].map((day) => ({ day: `2999-07-${day}`, part: 'morning' }))], // prettier-ignore
    ['the same twice', [{ day: '2999-07-01', part: 'morning' }, { day: '2999-07-01', part: 'morning' }]], // prettier-ignore
  ])('is refused with %s', async (_, days) => {
    const { id } = await offered();
    const asked = { version: 1, answer: 'another day', days, note: '' };
    expect((await owner.agent.post(`${own}/${id}/answer`).send(asked)).status).toBe(422);
  });

  test('takes it into a calendar', async () => {
    const { id } = await offered();
    const file = await owner.agent.get(`${own}/${id}/calendar`);
    expect(file.status).toBe(200);
    expect(file.headers['content-type']).toBe('text/calendar; charset=utf-8');
    expect(file.headers['content-disposition']).toBe('attachment; filename="appointment.ics"');
    expect(file.text).toContain(`UID:${id}@127.0.0.1`);
  });

  test('sees and answers nobody else’s', async () => {
    const { id } = await offered();
    const other = await aSignedInOwner(running, scheme, { name: 'Other', email: 'o@example.org' });
    expect((await other.agent.get(own)).body).toEqual([]);
    const agreed = { version: 1, answer: 'agree' };
    for (const which of [id, UNKNOWN_ID]) {
      const answer = await other.agent.post(`${own}/${which}/answer`).send(agreed);
      const file = await other.agent.get(`${own}/${which}/calendar`);
      expect([answer.status, file.status]).toEqual([404, 404]);
    }
  });
});

describe('an end', () => {
  test('by calling it off takes it out of calendars, and nothing follows', async () => {
    const { id } = await offered();
    const off = await assessor.patch(`${address}/${id}`).send({ change: 'cancel', version: 1 });
    expect(off.body).toMatchObject({ state: 'cancelled', version: 2 });
    const [, mail] = await mails();
    expect(mail?.attachments?.[0]?.contentType).toContain('method=CANCEL');
    expect(calendarOf(mail)).toMatch(/METHOD:CANCEL[^]*SEQUENCE:2[^]*STATUS:CANCELLED/);
    const agreed = { version: 2, answer: 'agree' };
    expect((await owner.agent.post(`${own}/${id}/answer`).send(agreed)).status).toBe(409);
  });

  test('by having taken place is not written about', async () => {
    const { id } = await offered();
    const done = await assessor.patch(`${address}/${id}`).send({ change: 'done', version: 1 });
    expect(done.body).toMatchObject({ state: 'done' });
    expect(await mails()).toHaveLength(1);
  });
});

test('is for those who may, and of its own scheme', async () => {
  const { id } = await offered();
  expect((await (await visitor(app())).get(address)).status).toBe(401);
  const witness = await signIn(app(), await aMember(scheme, 'witness'));
  expect((await witness.get(address)).status).toBe(403);
  expect((await owner.agent.get(address)).status).toBe(403);
  expect((await owner.agent.post(address).send(anAppointment())).status).toBe(403);
  expect((await assessor.get(own)).status).toBe(403);
  const other = await aScheme();
  const agent = await signIn(app(), await aMember(other, 'assessor'));
  const moved = `/api/schemes/${other.id}/appointments/${id}`;
  expect((await agent.patch(moved).send({ change: 'cancel', version: 1 })).status).toBe(404);
});
