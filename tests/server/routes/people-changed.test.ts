import { QueryTypes } from 'sequelize';
import { beforeAll, describe, expect, test, vi } from 'vitest';
import { personSchema } from '../../../shared/schemas/people.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Person } from '../../../server/models/person.ts';
import { anAdministrator, aPerson } from '../../support/factories.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app, services } = testApp();
let administrator: Person;

beforeAll(async () => {
  administrator = await anAdministrator();
});

function asAdministrator() {
  return signIn(app(), administrator);
}

describe('changing a person', () => {
  test('keeps name and rights and tells the trail from what to what', async () => {
    const person = await aPerson({ name: 'Before' });
    const agent = await asAdministrator();
    const answer = await agent
      .patch(`/api/people/${person.id}`)
      .send({ name: 'After', isAdministrator: true });
    expect(personSchema.parse(answer.body)).toMatchObject({ name: 'After', isAdministrator: true });
    expect(await person.reload()).toMatchObject({ name: 'After', isAdministrator: true });
    const entries = await AuditEntry.findAll({ where: { subjectId: person.id } });
    expect(entries).toMatchObject([
      {
        action: 'change person',
        personId: administrator.id,
        before: { name: 'Before', isAdministrator: false },
        after: { name: 'After', isAdministrator: true },
      },
    ]);
    await person.update({ isAdministrator: false });
  });

  test('leaves what is not named', async () => {
    const person = await aPerson({ isAdministrator: true });
    await (await asAdministrator()).patch(`/api/people/${person.id}`).send({ name: 'Only this' });
    expect(await person.reload()).toMatchObject({ name: 'Only this', isAdministrator: true });
    await person.update({ isAdministrator: false });
  });

  test('never takes the last administrator, one who is only invited does not count', async () => {
    const invited = await aPerson({ isAdministrator: true, password: null });
    const others = await Person.findAll({ where: { isAdministrator: true } });
    const away = others.filter(({ id }) => id !== administrator.id && id !== invited.id);
    await Promise.all(away.map((person) => person.update({ isAdministrator: false })));
    const agent = await asAdministrator();
    const answer = await agent
      .patch(`/api/people/${administrator.id}`)
      .send({ isAdministrator: false });
    expect(answer.status).toBe(409);
    expect(await administrator.reload()).toMatchObject({ isAdministrator: true });
  });

  test('leaves one of two who take each other’s rights at once', async () => {
    const other = await anAdministrator();
    const [one, two] = [await asAdministrator(), await signIn(app(), other)];
    const { database } = services();
    const both = await database.transaction(async (transaction) => {
      await Person.findAll({ transaction, lock: true });
      const sent = Promise.all([
        one.patch(`/api/people/${other.id}`).send({ isAdministrator: false }),
        two.patch(`/api/people/${administrator.id}`).send({ isAdministrator: false }),
      ]);
      await vi.waitFor(async () => {
        const waiting = `select 1 from pg_stat_activity
          where datname = current_database() and wait_event_type = 'Lock'`;
        expect(await database.query(waiting, { type: QueryTypes.SELECT })).toHaveLength(2);
      });
      return { sent };
    });
    const answers = await both.sent;
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const left = [await administrator.reload(), await other.reload()];
    expect(left.filter(({ isAdministrator }) => isAdministrator)).toHaveLength(1);
    await administrator.update({ isAdministrator: true });
    await other.update({ isAdministrator: false });
  });

  test.each([{ name: '' }, { email: 'new@example.org' }, { isAdministrator: 'yes' }])(
    'does not take %j',
    async (body) => {
      const person = await aPerson();
      const answer = await (await asAdministrator()).patch(`/api/people/${person.id}`).send(body);
      expect(answer.status).toBe(422);
      expect(await Person.findByPk(person.id)).toMatchObject({ email: person.email });
    },
  );
});
