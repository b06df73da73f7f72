import request from 'supertest';
import { expect, test } from 'vitest';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();

test('a scheme is not shown to somebody who is not signed in', async () => {
  const answer = await request(app()).get('/api/schemes/3fa85f64-5717-4562-b3fc-2c963f66afa6');
  expect(answer.status).toBe(401);
  expect(answer.body).toMatchObject({ error: { code: 'not-signed-in' } });
});
