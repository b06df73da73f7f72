import { setTimeout as sleep } from 'node:timers/promises';
import { QueryTypes } from 'sequelize';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { openBoss, type Boss } from '../../../server/jobs/open-boss.ts';
import { openOutbox } from '../../../server/mail/open-outbox.ts';
import type { Outbox } from '../../../server/mail/outbox.ts';
import { issueLink } from '../../../server/commands/issue-link.ts';
import { aPerson, aScheme } from '../../support/factories.ts';
import { testApp } from '../../support/test-app.ts';

const { services, letters } = testApp();
let queues: Boss;
let outbox: Outbox;

beforeEach(async () => {
  queues = await openBoss(services());
  outbox = await openOutbox({ ...services(), queues });
});

afterEach(async () => {
  await queues.close();
});

function count(query: string, bind: unknown[] = []): Promise<number> {
  return services()
    .database.query<{ count: number }>(`select count(*)::integer as count ${query}`, {
      type: QueryTypes.SELECT,
      bind,
    })
    .then(([row]) => row?.count ?? 0);
}

async function aMailTo(recipient: string): Promise<void> {
  const { id: schemeId } = await aScheme();
  const mail = { schemeId, recipient, subject: 'About your home', parts: ['Some words.'] };
  await services().database.transaction((transaction) => outbox.put([mail], transaction));
}

async function untilEnded(recipient: string): Promise<void> {
  while ((await count(`from outbox where recipient = $1 and state = 'waiting'`, [recipient])) > 0) {
    await sleep(50);
  }
}

test('what is put in goes out over the queue of the database', async () => {
  await aMailTo('queue@example.org');
  await untilEnded('queue@example.org');
  expect(letters.filter(({ to }) => to === 'queue@example.org')).toHaveLength(1);
});

test('what is put in by a transaction that is given up never goes out', async () => {
  const { id: schemeId } = await aScheme();
  const mail = { schemeId, recipient: 'never@example.org', subject: 'No', parts: ['No.'] };
  await services()
    .database.transaction(async (transaction) => {
      await outbox.put([mail], transaction);
      throw new Error('given up');
    })
    .catch(() => undefined);
  expect(await count(`from outbox where recipient = 'never@example.org'`)).toBe(0);
});

test('a mail that waits is called for once, however many starts call again for all that waits', async () => {
  await aMailTo('later@example.org');
  await untilEnded('later@example.org');
  const { database } = services();
  await database.query(
    `update outbox set state = 'waiting', ended_at = null, next_try_at = now() + interval '1 hour'
     where recipient = 'later@example.org'`,
  );
  expect(await outbox.recover()).toBe(1);
  expect(await outbox.recover()).toBe(1);
  const waiting = `from pgboss.job j join outbox o on o.id::text = j.data->>'mailId'
    where o.recipient = 'later@example.org' and j.state = 'created'`;
  expect(await count(waiting)).toBe(1);
});

test('a letter of an account goes before those to owners that wait', async () => {
  const person = await aPerson();
  const { database, env } = services();
  const mail = { recipient: 'account@example.org', subject: 'A new password', parts: ['Ada,'] };
  await database.transaction(async (transaction) => {
    const { id: linkId } = await issueLink(env, person.id, 'password-reset', transaction);
    await outbox.put([{ ...mail, schemeId: null, linkId }], transaction);
    const [first] = await database.query<{ priority: number }>(
      `select priority from pgboss.job where name = 'outbox' and state = 'created'
       order by priority desc limit 1`,
      { type: QueryTypes.SELECT, transaction },
    );
    expect(first?.priority).toBe(1);
  });
});
