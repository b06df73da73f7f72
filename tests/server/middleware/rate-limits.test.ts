import type { Server } from 'node:http';
import request from 'supertest';
import { describe, expect, test } from 'vitest';
import { aPerson, PASSWORD } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const LIMIT = 3;
const { app } = testApp({ env: { RATE_LIMIT: String(LIMIT), TRUST_PROXY: '1' } });

/** Each test comes from an IP address of its own. */
let machines = 0;
function machine(): string {
  machines += 1;
  return `203.0.113.${machines}`;
}

async function visitorFrom(running: Server, ip: string) {
  return (await visitor(running)).set('X-Forwarded-For', ip);
}

describe('wrong sign-ins', () => {
  test('for one address are stopped, even with the right password then', async () => {
    const { email } = await aPerson();
    const agent = await visitorFrom(app(), machine());
    for (let tried = 0; tried < LIMIT; tried += 1) {
      const wrong = await agent.post('/api/session').send({ email, password: 'wrong' });
      expect(wrong.status).toBe(401);
    }
    const capitals = email.toUpperCase();
    const answer = await agent.post('/api/session').send({ email: capitals, password: PASSWORD });
    expect(answer.status).toBe(429);
    const message = expect.stringMatching(/^Too many tries\. Wait 1[45] minutes\.$/) as string;
    expect(answer.body).toMatchObject({ error: { code: 'too-many-requests', message } });
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
  });

  test('for one address stop neither others nor the same elsewhere', async () => {
    const [person, other] = [await aPerson(), await aPerson()];
    const ip = machine();
    const agent = await visitorFrom(app(), ip);
    for (let tried = 0; tried <= LIMIT; tried += 1) {
      await agent.post('/api/session').send({ email: person.email, password: 'wrong' });
    }
    const beside = await agent
      .post('/api/session')
      .send({ email: other.email, password: PASSWORD });
    expect(beside.status).toBe(200);
    const elsewhere = await visitorFrom(app(), machine());
    const answer = await elsewhere
      .post('/api/session')
      .send({ email: person.email, password: PASSWORD });
    expect(answer.status).toBe(200);
  });

  test('for many addresses from one machine are stopped as well', async () => {
    const agent = await visitorFrom(app(), machine());
    for (let tried = 0; tried < 10 * LIMIT; tried += 1) {
      const email = `guess-${tried}@example.org`;
      await agent.post('/api/session').send({ email, password: 'wrong' });
    }
    const { email } = await aPerson();
    const answer = await agent.post('/api/session').send({ email, password: PASSWORD });
    expect(answer.status).toBe(429);
  });
});

test('right sign-ins do not count', async () => {
  const { email } = await aPerson();
  const ip = machine();
  for (let tried = 0; tried < LIMIT + 2; tried += 1) {
    const agent = await visitorFrom(app(), ip);
    const answer = await agent.post('/api/session').send({ email, password: PASSWORD });
    expect(answer.status).toBe(200);
  }
});

test('letters to one address are stopped, whether it is known or not', async () => {
  const person = await aPerson();
  for (const email of [person.email, 'unknown@example.org']) {
    const agent = await visitorFrom(app(), machine());
    const statuses = [];
    for (let tried = 0; tried <= LIMIT; tried += 1) {
      statuses.push((await agent.post('/api/password-resets').send({ email })).status);
    }
    expect(statuses).toEqual([...Array<number>(LIMIT).fill(202), 429]);
  }
});

test('guesses of links are stopped', async () => {
  const ip = machine();
  for (let tried = 0; tried < 10 * LIMIT; tried += 1) {
    const answer = await request(app()).get(`/api/links/guess-${tried}`).set('X-Forwarded-For', ip);
    expect(answer.status).toBe(410);
  }
  const answer = await request(app()).get('/api/links/another').set('X-Forwarded-For', ip);
  expect(answer.status).toBe(429);
});

test('guesses of one’s own password are stopped', async () => {
  const agent = await signIn(app(), await aPerson());
  const newPassword = 'another wall at high tide';
  for (let tried = 0; tried < LIMIT; tried += 1) {
    const wrong = { currentPassword: 'wrong', newPassword };
    expect((await agent.put('/api/session/password').send(wrong)).status).toBe(422);
  }
  const right = { currentPassword: PASSWORD, newPassword };
  expect((await agent.put('/api/session/password').send(right)).status).toBe(429);
});
