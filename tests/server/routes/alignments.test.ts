import { describe, expect, test } from 'vitest';
import { alignmentSchema, alignmentsSchema } from '../../../shared/schemas/alignments.ts';
import { Alignment } from '../../../server/models/alignment.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aDesign, aRange } from '../../support/designs.ts';
import { aMember, anAdministrator, anAlignment, aScheme } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const { app } = testApp();

const TWIN = { kind: 'twin', spacing: 15, later: 'left', laterFactor: 1.2 } as const;
const DESIGN = aDesign({
  line: [[0, 0], [300, 0], [300, 400]],
  bores: TWIN,
  intervals: [{ from: 10, to: 60, volumeLoss: aRange(0.01), troughWidth: aRange(0.5) }],
}); // prettier-ignore

function addressOf({ id }: { readonly id: string }, alignment?: { readonly id: string }): string {
  const all = `/api/schemes/${id}/alignments`;
  return alignment === undefined ? all : `${all}/${alignment.id}`;
}

async function aDesigner() {
  const scheme = await aScheme();
  const person = await aMember(scheme, 'designer');
  return { scheme, person, address: addressOf(scheme), agent: await signIn(app(), person) };
}

async function actionsOf(scheme: Scheme): Promise<string[]> {
  const entries = await AuditEntry.findAll({ where: { schemeId: scheme.id }, order: ['id'] });
  return entries.map(({ action }) => action);
}

/** What no option may be, each with the field at fault. */
const FAULTY = [
  [{ line: [[0, 0]] }, 'design.line'],
  [{ line: [[0, 0], [100, 0], [100, 0]] }, 'design.line.2'],
  [{ line: [[0, 0], [100, 0], [100, 6], [0, 6]], bores: { ...TWIN, spacing: 40 } }, 'design.line.2'],
  [{ bores: { ...TWIN, spacing: 4 } }, 'design.bores.spacing'],
  [{ levels: [] }, 'design.levels'],
  [{ levels: [{ chainage: 5, level: 0 }, { chainage: 5, level: 0 }] }, 'design.levels'],
  [{ diameter: 0 }, 'design.diameter'],
  [{ volumeLoss: { low: 0.02, central: 0.01, high: 0.03 } }, 'design.volumeLoss'],
  [{ volumeLoss: aRange(0.15) }, 'design.volumeLoss.high'],
  [{ intervals: [{ from: 9, to: 9, volumeLoss: aRange(0.01), troughWidth: aRange(0.5) }] }, 'design.intervals.0.to'],
] as const; // prettier-ignore

describe('an option', () => {
  test('is drawn, read by itself and listed by name, and the trail tells it', async () => {
    const { scheme, person, address, agent } = await aDesigner();
    const answer = await agent.post(address).send({ name: ' Option 10 ', design: DESIGN });
    expect(answer.status).toBe(201);
    const made = alignmentSchema.parse(answer.body);
    expect(made).toMatchObject({
      ...{ name: 'Option 10', version: 1, design: DESIGN, length: 700, changedBy: person.name },
    });
    await agent.post(address).send({ name: 'Option 9', design: DESIGN });
    const listed = alignmentsSchema.parse((await agent.get(address)).body);
    expect(listed.map(({ name }) => name)).toEqual(['Option 9', 'Option 10']);
    expect((await agent.get(`${address}/${made.id}`)).body).toEqual(made);
    expect(await Alignment.findByPk(made.id)).toMatchObject({
      ...{ schemeId: scheme.id, name: 'Option 10', design: DESIGN, changedBy: person.id },
    });
    expect(await actionsOf(scheme)).toEqual(['create alignment', 'create alignment']);
  });

  test('has shafts, which its copies have too, a change leaves and the trail tells', async () => {
    const { scheme, address, agent } = await aDesigner();
    const shafts = [{ name: 'East shaft', east: 600, north: 5.5, source: 'Drawing 12' }];
    const answer = await agent.post(address).send({ name: 'A', design: DESIGN, shafts });
    const made = alignmentSchema.parse(answer.body);
    expect(made.shafts).toEqual(shafts);
    const copied = await agent.post(`${address}/${made.id}/copies`).send({ name: 'B' });
    expect(alignmentSchema.parse(copied.body).shafts).toEqual(shafts);
    const at = `${address}/${made.id}`;
    const named = await agent.patch(at).send({ version: 1, name: 'C' });
    expect(alignmentSchema.parse(named.body).shafts).toEqual(shafts);
    const none = await agent.patch(at).send({ version: 2, shafts: [] });
    expect(alignmentSchema.parse(none.body)).toMatchObject({
      version: 3,
      shafts: [],
      design: DESIGN,
    });
    const entries = await AuditEntry.findAll({ where: { schemeId: scheme.id }, order: ['id'] });
    expect(entries.at(-1)).toMatchObject({ before: { shafts }, after: { shafts: [] } });
  });

  test.each([
    ['without a name', { name: ' ' }, 'shafts.0.name'],
    ['without a source', { source: '' }, 'shafts.0.source'],
    ['nowhere', { east: null }, 'shafts.0.east'],
  ])('is refused with a shaft %s', async (_, bad, path) => {
    const { address, agent } = await aDesigner();
    const shaft = { name: 'East shaft', east: 600, north: 5.5, source: 'Drawing 12', ...bad };
    const answer = await agent.post(address).send({ name: 'A', design: DESIGN, shafts: [shaft] });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path }] } });
  });

  test('is refused with two shafts of one name', async () => {
    const { address, agent } = await aDesigner();
    const shaft = { name: 'East shaft', east: 600, north: 5.5, source: 'Drawing 12' };
    const asked = { name: 'A', design: DESIGN, shafts: [shaft, { ...shaft, east: 9 }] };
    expect((await agent.post(address).send(asked)).body).toMatchObject({ error: { fields: [{ path: 'shafts' }] } }); // prettier-ignore
  });

  test.each(FAULTY)('is refused with %j at %s', async (bad, path) => {
    const { scheme, address, agent } = await aDesigner();
    const design = { ...DESIGN, ...bad };
    const answer = await agent.post(address).send({ name: 'Bad', design });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { code: 'invalid-input', fields: [{ path }] } });
    const kept = await anAlignment(scheme);
    const change = await agent.patch(`${address}/${kept.id}`).send({ version: 1, design });
    expect(change.body).toMatchObject({ error: { fields: [{ path }] } });
    expect(await Alignment.findAll({ where: { schemeId: scheme.id } })).toMatchObject([
      { id: kept.id, version: 1, design: kept.design },
    ]);
  });

  test('has a name of its own in its scheme, whatever its capitals', async () => {
    const { scheme, address, agent } = await aDesigner();
    const [one, two] = [
      await anAlignment(scheme, { name: 'Süd' }),
      await anAlignment(scheme, { name: 'Nord' }),
    ];
    const taken = { error: { code: 'already-exists', fields: [{ path: 'name' }] } };
    const name = 'SÜD';
    const answers = [
      await agent.post(address).send({ name, design: DESIGN }),
      await agent.post(`${address}/${two.id}/copies`).send({ name }),
      await agent.patch(`${address}/${two.id}`).send({ version: 1, name }),
    ];
    for (const { status, body } of answers) expect([status, body]).toMatchObject([409, taken]);
    expect((await agent.patch(`${address}/${one.id}`).send({ version: 1, name })).status).toBe(200);
    const other = await aDesigner();
    expect((await other.agent.post(other.address).send({ name, design: DESIGN })).status).toBe(201);
    expect(await Alignment.count({ where: { schemeId: scheme.id } })).toBe(2);
  });

  test('may have thousands of points', async () => {
    const { address, agent } = await aDesigner();
    const line = Array.from({ length: 5000 }, (_, k) => [500_000.123 + 3.5 * k, 6_000_000.456]);
    const long = { ...aDesign(), line };
    expect((await agent.post(address).send({ name: 'Long', design: long })).status).toBe(201);
  });

  test('is one of sixty at most', async () => {
    const { scheme, address, agent } = await aDesigner();
    for (let k = 0; k < 60; k++) await anAlignment(scheme);
    const answer = await agent.post(address).send({ name: 'One more', design: DESIGN });
    expect(answer.body).toMatchObject({ error: { fields: [{ path: 'name' }] } });
    expect(await Alignment.count({ where: { schemeId: scheme.id } })).toBe(60);
  });
});

describe('changing an option', () => {
  test('keeps who and what, and the trail from what to what', async () => {
    const { scheme, person, address, agent } = await aDesigner();
    const option = await anAlignment(scheme, { name: 'Before' });
    const answer = await agent
      .patch(`${address}/${option.id}`)
      .send({ version: 1, name: 'After', design: DESIGN });
    expect(answer.status).toBe(200);
    expect(alignmentSchema.parse(answer.body)).toMatchObject({
      ...{ name: 'After', version: 2, design: DESIGN, changedBy: person.name },
    });
    expect(await option.reload()).toMatchObject({ name: 'After', changedBy: person.id });
    const [entry] = await AuditEntry.findAll({ where: { schemeId: scheme.id } });
    expect(entry).toMatchObject({
      ...{ action: 'change alignment', subjectKind: 'alignment', subjectId: option.id },
      ...{
        before: { name: 'Before', design: aDesign() },
        after: { name: 'After', design: DESIGN },
      },
    });
  });

  test('of two at once is done once; who comes second is told', async () => {
    const { scheme, address, agent } = await aDesigner();
    const option = await anAlignment(scheme);
    const send = (diameter: number) =>
      agent.patch(`${address}/${option.id}`).send({ version: 1, design: { ...DESIGN, diameter } });
    const answers = await Promise.all([send(5), send(6)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const late = answers.find(({ status }) => status === 409);
    expect(late?.body).toMatchObject({ error: { code: 'conflict' } });
    expect((await option.reload()).version).toBe(2);
    expect(await actionsOf(scheme)).toEqual(['change alignment']);
  });
});

describe('copying and removing an option', () => {
  test('a copy starts as the other is, and goes its own way', async () => {
    const { scheme, address, agent } = await aDesigner();
    const option = await anAlignment(scheme, { design: DESIGN });
    const answer = await agent.post(`${address}/${option.id}/copies`).send({ name: 'Copy' });
    expect(answer.status).toBe(201);
    const copy = alignmentSchema.parse(answer.body);
    expect(copy).toMatchObject({ name: 'Copy', version: 1, design: DESIGN });
    const change = { version: 1, design: aDesign() };
    expect((await agent.patch(`${address}/${copy.id}`).send(change)).status).toBe(200);
    expect((await option.reload()).design).toEqual(DESIGN);
    expect(await actionsOf(scheme)).toEqual(['copy alignment', 'change alignment']);
  });

  test('a copy without a name is refused', async () => {
    const { scheme, address, agent } = await aDesigner();
    const option = await anAlignment(scheme);
    const answer = await agent.post(`${address}/${option.id}/copies`).send({ name: ' ' });
    expect(answer.body).toMatchObject({ error: { fields: [{ path: 'name' }] } });
    expect(await Alignment.count({ where: { schemeId: scheme.id } })).toBe(1);
  });

  test('what is removed is gone, but the trail keeps it', async () => {
    const { scheme, address, agent } = await aDesigner();
    const option = await anAlignment(scheme, { name: 'Gone' });
    expect((await agent.delete(`${address}/${option.id}`)).status).toBe(204);
    for (const again of [
      await agent.delete(`${address}/${option.id}`),
      await agent.get(`${address}/${option.id}`),
      await agent.patch(`${address}/${option.id}`).send({ version: 1, name: 'Back' }),
    ]) {
      expect(again.status).toBe(404);
    }
    expect(await Alignment.findByPk(option.id)).toBeNull();
    const [entry] = await AuditEntry.findAll({ where: { schemeId: scheme.id } });
    expect(entry).toMatchObject({
      ...{ action: 'remove alignment', before: { name: 'Gone', design: aDesign() } },
    });
  });
});

describe('who', () => {
  test.each(['assessor', 'witness'] as const)('the %s reads and changes nothing', async (role) => {
    const scheme = await aScheme();
    const option = await anAlignment(scheme);
    const agent = await signIn(app(), await aMember(scheme, role));
    expect((await agent.get(addressOf(scheme))).status).toBe(200);
    expect((await agent.get(addressOf(scheme, option))).status).toBe(200);
    const tries = [
      await agent.post(addressOf(scheme)).send({ name: 'Mine', design: DESIGN }),
      await agent.patch(addressOf(scheme, option)).send({ version: 1, name: 'Mine' }),
      await agent.post(`${addressOf(scheme, option)}/copies`).send({ name: 'Mine' }),
      await agent.delete(addressOf(scheme, option)),
    ];
    expect(tries.map(({ status }) => status)).toEqual([403, 403, 403, 403]);
    expect(await Alignment.count({ where: { schemeId: scheme.id, version: 1 } })).toBe(1);
  });

  test('the administrator reads; owners, strangers and nobody do not', async () => {
    const scheme = await aScheme();
    const option = await anAlignment(scheme);
    const agents = [
      [await signIn(app(), await anAdministrator()), 200],
      [await signIn(app(), await aMember(scheme, 'owner')), 403],
      [(await aDesigner()).agent, 404],
      [await visitor(app()), 401],
    ] as const;
    for (const [agent, status] of agents) {
      expect((await agent.get(addressOf(scheme))).status).toBe(status);
      expect((await agent.get(addressOf(scheme, option))).status).toBe(status);
    }
  });

  test('an option of another scheme answers like one that is not there', async () => {
    const { scheme, agent } = await aDesigner();
    const foreign = await anAlignment(await aScheme());
    for (const send of [
      (id: string) => agent.get(addressOf(scheme, { id })),
      (id: string) => agent.patch(addressOf(scheme, { id })).send({ version: 1, name: 'Mine' }),
      (id: string) => agent.post(`${addressOf(scheme, { id })}/copies`).send({ name: 'Mine' }),
      (id: string) => agent.delete(addressOf(scheme, { id })),
    ]) {
      const [theirs, unknown] = [await send(foreign.id), await send(UNKNOWN_ID)];
      expect([theirs.status, theirs.text]).toEqual([404, unknown.text]);
    }
    expect((await foreign.reload()).version).toBe(1);
  });

  test('in an archived scheme options are only read', async () => {
    const { scheme, address, agent } = await aDesigner();
    const option = await anAlignment(scheme);
    await scheme.update({ archivedAt: new Date() });
    expect((await agent.get(address)).status).toBe(200);
    const answer = await agent.delete(addressOf(scheme, option));
    expect(answer.body).toMatchObject({ error: { code: 'archived' } });
  });
});
