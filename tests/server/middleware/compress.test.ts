import express from 'express';
import request from 'supertest';
import { expect, test } from 'vitest';
import { compress } from '../../../server/middleware/compress.ts';

const LONG = JSON.stringify('harbour wall '.repeat(500));

function app() {
  const made = express();
  made.use(compress());
  made.get('/events', (_req, res) => {
    res.type('text/event-stream').send(LONG);
  });
  made.get('/range', (_req, res) => {
    res.status(206).set('Content-Range', 'bytes 0-6501/9000').type('text/plain').send(LONG);
  });
  made.get('/{*any}', (req, res) => {
    res.type(typeof req.query.type === 'string' ? req.query.type : 'json').send(Buffer.from(LONG));
  });
  return made;
}

async function encodingOf(path: string, encodings = 'gzip'): Promise<unknown> {
  const answer = await request(app()).get(path).set('Accept-Encoding', encodings);
  return answer.headers['content-encoding'];
}

test.each([
  '/api/schemes',
  '/api/schemes/1/buildings?search=/api/session',
  '/api/sessional',
  '/tiles/14/1/2.pbf?type=application/octet-stream',
  '/api/schemes/1/tiles/1.pbf?type=application/vnd.mapbox-vector-tile',
  '/assets/index.js?type=text/javascript',
])('%s is compressed', async (path) => {
  expect(await encodingOf(path)).toBe('gzip');
  expect(await encodingOf(path, 'gzip, br')).toBe('br');
  expect(await encodingOf(path, 'identity')).toBeUndefined();
});

test.each([
  '/api/session',
  '/API/Session/',
  '/api/session?again=1',
  '/api/session/password',
  '/api/sessions',
  '/api/links/token',
  '/api/mailbox/1',
])('%s holds a secret and is not', async (path) => {
  expect(await encodingOf(path)).toBeUndefined();
});

test('events, ranges and pictures are left as they are', async () => {
  expect(await encodingOf('/events')).toBeUndefined();
  expect(await encodingOf('/range')).toBeUndefined();
  expect(await encodingOf('/picture?type=image/png')).toBeUndefined();
});
