import { randomUUID } from 'node:crypto';
import { describe, expect, test } from 'vitest';
import {
  ownLetterSchema,
  ownLettersSchema,
  ownLetterTextSchema,
  ownSchema,
  type Own,
} from '../../../shared/schemas/own.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Building } from '../../../server/models/building.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { anOwner, someLetters } from '../../support/owners.ts';
import { registered } from '../../support/register.ts';
import { aRun, aTownToRun } from '../../support/runs.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const tested = testApp();
const { app } = tested;

/** A town after a run in which two owners have a house each, told by their names. */
async function aStreet() {
  const { scheme, option } = await aTownToRun();
  const buildings = await registered(scheme);
  const houseOf = async (reference: string, name: string) => {
    const found = buildings.find((one) => one.reference === reference);
    if (found === undefined) throw new Error(`There is no building ${reference}.`);
    return found.update({ name, address: `1 ${name} Lane`, use: 'dwelling' });
  };
  const mine = await houseOf('T1-2', 'Minehouse');
  const theirs = await houseOf('T2-2', 'Foreignhouse');
  const run = await aRun(tested, scheme, option);
  const ada = await anOwner(scheme, 'Ada Mine', [mine.id]);
  const bob = await anOwner(scheme, 'Bob Foreign', [theirs.id]);
  const agent = await signIn(app(), ada.person);
  const address = `/api/schemes/${scheme.id}/own`;
  return { scheme, option, mine, theirs, run, ada, bob, agent, address };
}

type Street = Awaited<ReturnType<typeof aStreet>>;

async function read({ agent, address }: Pick<Street, 'agent' | 'address'>): Promise<Own> {
  return ownSchema.parse((await agent.get(address)).body);
}

function onlyBuilding({ buildings }: Own) {
  const [building, ...others] = buildings;
  if (building === undefined || others.length > 0) throw new Error('There is not one building.');
  return building;
}

describe('an owner', () => {
  test('is told of no figures before a letter with them was sent', async () => {
    const street = await aStreet();
    const { scheme, mine, ada, run } = street;
    const before = onlyBuilding(await read(street));
    expect(before).toMatchObject({ id: mine.id, name: 'Minehouse', figures: null, decision: null });
    const letter = { partyId: ada.partyId, buildings: [mine.id] };
    await someLetters(scheme, { runId: run.id, isSent: false, letters: [letter] });
    await someLetters(scheme, { runId: null, letters: [letter] });
    const own = await read(street);
    expect(onlyBuilding(own).figures).toBeNull();
    expect(own.letters).toHaveLength(1);
  });

  test('is told what the run of the newest letter found, and where the tunnel lies', async () => {
    const street = await aStreet();
    const { scheme, option, mine, theirs, ada, bob, run } = street;
    await someLetters(scheme, {
      runId: run.id,
      letters: [
        { partyId: ada.partyId, buildings: [mine.id, theirs.id], subject: 'About your home' },
        { partyId: bob.partyId, buildings: [theirs.id], subject: 'Not for Ada' },
      ],
    });
    // a later run that nobody has been told of
    await aRun(tested, scheme, option);
    const own = await read(street);
    const { figures } = onlyBuilding(own);
    expect(figures).toMatchObject({ tunnels: 1, distance: 0, diameter: 6 });
    expect(figures?.category).not.toBeNull();
    expect(figures?.settlement).toBeGreaterThan(0);
    expect(figures?.most).toBeGreaterThanOrEqual(figures?.settlement ?? 0);
    expect(figures?.lines[0]?.[0]?.[0]).toBeCloseTo(3, 1);
    expect(own.letters).toMatchObject([{ subject: 'About your home', buildings: [mine.id] }]);
    expect(JSON.stringify(own)).not.toContain('Foreign');
  });
});

describe('a letter', () => {
  test('is read as it was sent and acknowledged once, with a mail and a line in the trail', async () => {
    const { scheme, mine, ada, agent, address } = await aStreet();
    const parts = ['Dear Ada,', 'Two things:', { list: ['one', 'two'] }, { link: 'Your page' }];
    const [id = ''] = await someLetters(scheme, {
      runId: null,
      letters: [{ partyId: ada.partyId, buildings: [mine.id], subject: 'First', parts }],
    });
    const letter = ownLetterTextSchema.parse((await agent.get(`${address}/letters/${id}`)).body);
    expect(letter).toMatchObject({
      name: 'Ada Mine',
      parts: ['Dear Ada,', 'Two things:', { list: ['one', 'two'] }],
      acknowledgedAt: null,
      answerBy: '2027-01-15',
    });
    const acknowledge = async () => {
      const answer = await agent.post(`${address}/letters/${id}/acknowledge`);
      return ownLetterSchema.parse(answer.body).acknowledgedAt;
    };
    const acknowledgedAt = await acknowledge();
    expect(acknowledgedAt).not.toBeNull();
    expect(await acknowledge()).toBe(acknowledgedAt);
    await tested.outbox().idle();
    const mails = tested.letters.filter(({ to }) => to === ada.person.email);
    expect(mails.map(({ subject }) => subject)).toEqual([
      'Thank you, we know that you have our letter',
    ]);
    expect(mails[0]?.text).toContain('“First”');
    const entries = await AuditEntry.findAll({ where: { subjectId: id } });
    expect(entries).toMatchObject([{ action: 'acknowledge letter', personId: ada.person.id }]);
    const letters = ownLettersSchema.parse((await agent.get(`${address}/letters`)).body);
    expect(letters).toMatchObject([{ id, acknowledgedAt }]);
  });

  test('of somebody else, or not sent, is not there', async () => {
    const { scheme, mine, theirs, ada, bob, agent, address } = await aStreet();
    const [foreign = ''] = await someLetters(scheme, {
      runId: null,
      letters: [{ partyId: bob.partyId, buildings: [theirs.id] }],
    });
    const [unsent = ''] = await someLetters(scheme, {
      runId: null,
      isSent: false,
      letters: [{ partyId: ada.partyId, buildings: [mine.id] }],
    });
    const unknown = await agent.get(`${address}/letters/${randomUUID()}`);
    for (const id of [foreign, unsent]) {
      const answer = await agent.get(`${address}/letters/${id}`);
      expect([answer.status, answer.text]).toEqual([404, unknown.text]);
      expect((await agent.post(`${address}/letters/${id}/acknowledge`)).status).toBe(404);
    }
    expect((await agent.get(`${address}/letters`)).body).toEqual([]);
    expect((await agent.get(`${address}/letters/not-a-number`)).status).toBe(404);
  });
});

test('the page is for owners of the scheme alone, and a house that was sold is no longer theirs', async () => {
  const { scheme, ada, agent, address } = await aStreet();
  expect((await (await visitor(app())).get(address)).status).toBe(401);
  const assessor = await signIn(app(), await aMember(scheme, 'assessor'));
  expect((await assessor.get(address)).status).toBe(403);
  const stranger = await signIn(app(), await aMember(await aScheme(), 'owner'));
  expect((await stranger.get(address)).status).toBe(404);
  const childless = await signIn(app(), await aMember(scheme, 'owner'));
  expect((await childless.get(address)).body).toMatchObject({ buildings: [], letters: [] });
  await scheme.sequelize.query(
    `update interests set to_day = current_date - 1 where party_id = '${ada.partyId}'`,
  );
  expect((await agent.get(address)).body).toMatchObject({ buildings: [] });
});

test('measures that are agreed are told by their titles, proposals are not', async () => {
  const { scheme, mine, theirs, agent, address } = await aStreet();
  const assessor = await signIn(app(), await aMember(scheme, 'assessor'));
  const measure = (title: string, state: string, buildings: readonly number[]) =>
    assessor.post(`/api/schemes/${scheme.id}/measures`).send({
      ...{ kind: 'at the building', title, state, buildings, detail: 'Inner words' },
      ...{ responsible: 'Somebody', due: null, limit: null },
    });
  await measure('Props in the cellar', 'agreed', [mine.id, theirs.id]);
  await measure('Perhaps grouting', 'proposed', [mine.id]);
  await measure('Foreign props', 'done', [theirs.id]);
  const { text } = await agent.get(address);
  expect(onlyBuilding(await read({ agent, address })).measures).toEqual([
    { title: 'Props in the cellar', state: 'agreed' },
  ]);
  expect(text).not.toMatch(/Foreign|grouting|Inner words|Somebody/);
  expect(await Building.count({ where: { schemeId: scheme.id } })).toBeGreaterThan(2);
});
