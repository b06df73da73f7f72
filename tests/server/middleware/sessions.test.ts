import request from 'supertest';
import { QueryTypes } from 'sequelize';
import { afterEach, describe, expect, test, vi } from 'vitest';
import type { Person } from '../../../server/models/person.ts';
import { cookieOf } from '../../support/cookie-of.ts';
import { aPerson } from '../../support/factories.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

describe('behind a proxy that speaks https', () => {
  const { app } = testApp({ env: { PUBLIC_URL: 'https://gs.example.org', TRUST_PROXY: '1' } });

  test('the cookie travels by https only', async () => {
    const answer = await request(app()).get('/api/session').set('X-Forwarded-Proto', 'https');
    expect(cookieOf(answer)).toMatch(/HttpOnly; Secure; SameSite=Lax/);
  });

  test('there is none for who comes without', async () => {
    const answer = await request(app()).get('/api/session');
    expect(answer.headers).not.toHaveProperty('set-cookie');
  });
});

describe('the life of a session', () => {
  const { app, services } = testApp();
  const MINUTE = 60_000;
  const TWELVE_HOURS = 720 * MINUTE;

  afterEach(() => {
    vi.useRealTimers();
  });

  /** The clock of the server stands still from here on. */
  function stopClock(): { forward: (minutes: number) => void; now: () => number } {
    vi.useFakeTimers({ toFake: ['Date'] });
    return {
      forward: (minutes) => vi.setSystemTime(Date.now() + minutes * MINUTE),
      now: () => Date.now(),
    };
  }

  async function expiryOf({ id }: Person): Promise<number> {
    const [row] = await services().database.query<{ expire: Date }>(
      `select expire from sessions where sess #>> '{passport,user}' = $id`,
      { bind: { id }, type: QueryTypes.SELECT },
    );
    return row?.expire.getTime() ?? NaN;
  }

  test('is put off once in ten minutes, however much is asked for', async () => {
    const person = await aPerson();
    const { forward, now } = stopClock();
    const agent = await signIn(app(), person);
    await agent.get('/api/schemes');
    const first = await expiryOf(person);
    expect(Math.abs(first - now() - TWELVE_HOURS)).toBeLessThanOrEqual(1000);
    forward(9);
    await agent.get('/api/schemes');
    expect(await expiryOf(person)).toBe(first);
    forward(2);
    await agent.get('/api/schemes');
    expect(await expiryOf(person)).toBe(first + 11 * MINUTE);
  });

  test('lasts while somebody works, and ends twelve hours later', async () => {
    const { forward } = stopClock();
    const agent = await signIn(app(), await aPerson());
    for (const minutes of [5, 700, 700, 700]) {
      forward(minutes);
      expect((await agent.get('/api/schemes')).status).toBe(200);
    }
    forward(721);
    expect((await agent.get('/api/schemes')).status).toBe(401);
  });

  test('is not brought back by a request that was under way when it ended', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    await Promise.all([
      agent.get('/api/schemes'),
      agent.delete('/api/session'),
      agent.get('/api/schemes'),
    ]);
    expect(await expiryOf(person)).toBeNaN();
  });
});
