import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { createDataFolder } from '../support/data-folder.ts';
import { visitor } from '../support/sign-in.ts';
import { testApp } from '../support/test-app.ts';

// the folder lies under one whose name begins with a dot
const { folder, remove } = createDataFolder('app');
const { app } = testApp({ root: folder });
const PAGE = '<!doctype html><title>Groundsill</title>';
const PROGRAM = 'export const answer = 42;\n'.repeat(200);

beforeAll(() => {
  const assets = path.join(folder, 'dist', 'client', 'assets');
  mkdirSync(assets, { recursive: true });
  writeFileSync(path.join(assets, '..', 'index.html'), PAGE);
  writeFileSync(path.join(assets, 'index-1.js'), PROGRAM);
});
afterAll(remove);

describe('the pages', () => {
  test.each(['/', '/schemes/1/plan'])(
    'are one page at %s, asked for anew each time',
    async (at) => {
      const answer = await request(app()).get(at);
      expect(answer.status).toBe(200);
      expect(answer.text).toBe(PAGE);
      expect(answer.headers['cache-control']).toBe('no-cache');
    },
  );

  test('keep the parts of the program for good, compressed on the way', async () => {
    const answer = await request(app()).get('/assets/index-1.js').set('Accept-Encoding', 'gzip');
    expect(answer.headers).toMatchObject({
      'content-encoding': 'gzip',
      'cache-control': 'public, max-age=31536000, immutable',
    });
    expect(answer.text).toBe(PROGRAM);
    expect((await request(app()).get('/assets/index-0.js')).status).toBe(404);
  });

  test('give a part of a file byte by byte', async () => {
    const answer = await request(app()).get('/assets/index-1.js').set('Range', 'bytes=0-1999');
    expect(answer.status).toBe(206);
    expect(answer.headers).not.toHaveProperty('content-encoding');
    expect(answer.text).toBe(PROGRAM.slice(0, 2000));
  });
});

describe('what nobody asks for', () => {
  test.each([
    ['post', '/'],
    ['delete', '/x'],
    ['put', '/schemes/1/plan'],
  ] as const)('%s %s is answered in our own words', async (method, at) => {
    const answer = await request(app())[method](at);
    expect(answer.status).toBe(404);
    expect(answer.body).toMatchObject({ error: { code: 'not-found' } });
  });

  test('robots are told to stay away', async () => {
    const answer = await request(app()).get('/robots.txt');
    expect(answer.headers['content-type']).toContain('text/plain');
    expect(answer.text).toBe('User-agent: *\nDisallow: /\n');
  });

  test('a body that is no JSON is refused as such', async () => {
    const agent = await visitor(app());
    const answer = await agent.post('/api/session').type('form').send({ email: 'a' });
    expect(answer.status).toBe(415);
    expect(answer.headers['cache-control']).toBe('no-store');
    expect(answer.body).toMatchObject({ error: { code: 'wrong-content-type' } });
  });
});
