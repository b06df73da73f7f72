import request from 'supertest';
import { describe, expect, test } from 'vitest';
import { z } from 'zod';
import { registerViewSchema } from '../../../shared/schemas/register-views.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { RegisterView } from '../../../server/models/register-view.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const { app } = testApp();
const views = z.array(registerViewSchema);

const VIEW = {
  name: 'Old quay',
  filter: { any: { use: ['shop', null] }, assumed: true },
  sort: { column: 'area', descending: true },
  columns: ['reference', 'area', 'use'],
};

async function aKeeper() {
  const scheme = await aScheme();
  const person = await aMember(scheme, 'assessor');
  const address = `/api/schemes/${scheme.id}/register-views`;
  return { scheme, person, address, agent: await signIn(app(), person) };
}

describe('a view of the register', () => {
  test('is kept as it was, by name', async () => {
    const { scheme, person, address, agent } = await aKeeper();
    const answer = await agent.post(address).send(VIEW);
    expect(answer.status).toBe(201);
    const kept = registerViewSchema.parse(answer.body);
    expect(kept).toEqual({ id: kept.id, ...VIEW });
    await agent.post(address).send({ ...VIEW, name: 'New quay' });
    expect(views.parse((await agent.get(address)).body).map(({ name }) => name)).toEqual([
      ...['New quay', 'Old quay'],
    ]);
    expect(await RegisterView.findByPk(kept.id)).toMatchObject({
      ...{ schemeId: scheme.id, personId: person.id, filter: VIEW.filter },
    });
    const trail = await AuditEntry.findAll({ where: { schemeId: scheme.id } });
    expect(trail.map(({ action }) => action)).toContain('keep register view');
  });

  test('of a name that is used again replaces the older one', async () => {
    const { address, agent } = await aKeeper();
    const first = registerViewSchema.parse((await agent.post(address).send(VIEW)).body);
    const again = await agent.post(address).send({ ...VIEW, columns: ['reference'] });
    expect(again.body).toMatchObject({ id: first.id, columns: ['reference'] });
    expect((await agent.get(address)).body).toHaveLength(1);
  });

  test('is its keeper’s alone', async () => {
    const { scheme, address, agent } = await aKeeper();
    const { id } = registerViewSchema.parse((await agent.post(address).send(VIEW)).body);
    const other = await signIn(app(), await aMember(scheme, 'assessor'));
    expect((await other.get(address)).body).toEqual([]);
    expect((await other.post(address).send({ ...VIEW, columns: ['area'] })).status).toBe(201);
    const [foreign, unknown] = [
      await other.delete(`${address}/${id}`),
      await other.delete(`${address}/${UNKNOWN_ID}`),
    ];
    expect([foreign.status, foreign.text]).toEqual([404, unknown.text]);
    expect((await agent.delete(`${address}/${id}`)).status).toBe(204);
    expect((await agent.delete(`${address}/${id}`)).status).toBe(404);
    expect(await RegisterView.count({ where: { schemeId: scheme.id } })).toBe(1);
  });

  test.each([
    [{ name: '' }],
    [{ name: 'a\nb' }],
    [{ columns: [] }],
    [{ columns: ['password'] }],
    [{ filter: { where: 'true' } }],
    [{ sort: { column: 'x', descending: true } }],
  ])('is refused with %j', async (bad) => {
    const { address, agent } = await aKeeper();
    expect((await agent.post(address).send({ ...VIEW, ...bad })).status).toBe(422);
    expect((await agent.get(address)).body).toEqual([]);
  });

  test('is not for owners, strangers or nobody', async () => {
    const { scheme, address } = await aKeeper();
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
    for (const [agent, status] of [
      [owner, 403],
      [stranger, 404],
    ] as const) {
      expect((await agent.get(address)).status).toBe(status);
      expect((await agent.post(address).send(VIEW)).status).toBe(status);
    }
    expect((await request(app()).get(address)).status).toBe(401);
  });
});
