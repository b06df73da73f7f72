import request from 'supertest';
import { describe, expect, test } from 'vitest';
import { cookieOf } from '../../support/cookie-of.ts';
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
