import request from 'supertest';
import { expect, test } from 'vitest';
import { loggedUrl } from '../../../server/middleware/log-requests.ts';
import { aLink, aPerson, PASSWORD } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const lines: string[] = [];
const { app } = testApp({
  env: { LOG_LEVEL: 'info' },
  log: { write: (line) => void lines.push(line) },
});

test.each([
  ['/api/links/abc', '/api/links/…'],
  ['/links/abc?from=mail', '/links/…?from=mail'],
  ['/api/links/abc/', '/api/links/…/'],
  ['/api/schemes/abc', '/api/schemes/abc'],
])('%s is logged as %s', (url, wanted) => {
  expect(loggedUrl(url)).toBe(wanted);
});

test('the log holds requests, but nothing to sign in with', async () => {
  const person = await aPerson();
  const token = await aLink(person);
  const agent = await signIn(app(), person);
  const begun = await agent.get('/api/session');
  const { csrfToken } = begun.body as { csrfToken: string };
  await agent.get(`/api/links/${token}`);
  await request(app()).get(`/links/${token}`);
  await (await visitor(app())).post(`/api/links/${token}`).send({ password: 'a new wall at noon' });
  const log = lines.join('\n');
  expect(log).toContain('/api/session');
  expect(log).toContain('/api/links/…');
  for (const secret of [token, csrfToken, PASSWORD, 'a new wall at noon', 'groundsill=s']) {
    expect(log).not.toContain(secret);
  }
});
