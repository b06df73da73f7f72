import { describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { apiGet, apiSend, noAnswer } from '../../../src/lib/api-client.ts';
import { ApiError, isRefusal } from '../../../src/lib/api-error.ts';
import { apiPath } from '../../../src/lib/api-path.ts';
import { queryClient, SESSION_KEY } from '../../../src/lib/query-client.ts';
import { anId, aSession } from '../../support/answers.ts';
import { fakeApi, Refusal } from '../../support/fake-api.ts';

const named = z.object({ name: z.string() });

async function errorOf(promise: Promise<unknown>): Promise<ApiError> {
  const error: unknown = await promise.catch((thrown: unknown) => thrown);
  if (error instanceof ApiError) return error;
  throw new Error(`No ApiError but ${String(error)}.`);
}

describe('apiGet', () => {
  it('gives the answer as the schema has it', async () => {
    fakeApi({ 'GET /api/x': { name: 'Port Dogger', more: 1 } });
    expect(await apiGet('/api/x', named)).toEqual({ name: 'Port Dogger' });
  });

  it('throws a refusal with its code, words and fields', async () => {
    const fields = [{ path: 'email', message: 'Somebody has it.' }];
    fakeApi({ 'GET /api/x': new Refusal(409, 'already-exists', 'There already.', fields) });
    const error = await errorOf(apiGet('/api/x', named));
    expect(error).toMatchObject({ code: 'already-exists', status: 409, fields });
    expect(error.message).toBe('There already.');
    expect(isRefusal(error, 'conflict', 'already-exists')).toBe(true);
    expect(isRefusal(error, 'conflict')).toBe(false);
  });

  it('names what is wrong with an answer that the schema does not know', async () => {
    fakeApi({ 'GET /api/x': { name: 3 } });
    const error = await errorOf(apiGet('/api/x', named));
    expect(error.code).toBe('unexpected-answer');
    expect(error.message).toContain('name');
  });

  it('takes a page of a proxy for what it is', async () => {
    vi.stubGlobal('fetch', () => Promise.resolve(new Response('<h1>Bad', { status: 502 })));
    expect(await errorOf(apiGet('/api/x', named))).toMatchObject({
      code: 'unexpected-answer',
      status: 502,
    });
  });

  it('says that there is no server, and lets a cancelled request be', async () => {
    fakeApi({});
    expect((await errorOf(apiGet('/api/x', named))).code).toBe('unreachable');
    const aborted = new DOMException('stop', 'AbortError');
    vi.stubGlobal('fetch', () => Promise.reject(aborted));
    await expect(apiGet('/api/x', named)).rejects.toBe(aborted);
  });
});

describe('apiSend', () => {
  it('carries the token of the session and its body as JSON', async () => {
    queryClient.setQueryData(SESSION_KEY, aSession());
    const { calls } = fakeApi({ 'POST /api/x': { name: 'made' } });
    await apiSend('POST', '/api/x', named, { a: 1 });
    expect(calls[0]?.body).toEqual({ a: 1 });
    expect(calls[0]?.headers.get('x-csrf-token')).toBe('token');
    expect(calls[0]?.headers.get('content-type')).toBe('application/json');
  });

  it('waits for the session where it has not been fetched yet', async () => {
    const { calls } = fakeApi({ 'GET /api/session': aSession(null), 'POST /api/x': { name: 'y' } });
    await Promise.all([apiSend('POST', '/api/x', named), apiSend('POST', '/api/x', named)]);
    expect(calls.map(({ route }) => route)).toEqual([
      'GET /api/session',
      'POST /api/x',
      'POST /api/x',
    ]);
    expect(calls[2]?.headers.get('x-csrf-token')).toBe('token');
  });

  it('sends once more where another window has renewed the session', async () => {
    queryClient.setQueryData(SESSION_KEY, aSession());
    const answers = [new Refusal(403, 'csrf-failed'), { name: 'made' }];
    const { calls } = fakeApi({
      'GET /api/session': { ...aSession(), csrfToken: 'renewed' },
      'POST /api/x': () => answers.shift(),
    });
    expect(await apiSend('POST', '/api/x', named, { a: 1 })).toEqual({ name: 'made' });
    expect(calls.map(({ headers }) => headers.get('x-csrf-token'))).toEqual([
      'token',
      null,
      'renewed',
    ]);
    expect(calls[2]?.body).toEqual({ a: 1 });
  });

  it('gives up after the second refusal', async () => {
    queryClient.setQueryData(SESSION_KEY, aSession());
    const { calls } = fakeApi({
      'GET /api/session': aSession(),
      'POST /api/x': new Refusal(403, 'csrf-failed'),
    });
    expect((await errorOf(apiSend('POST', '/api/x', named))).code).toBe('csrf-failed');
    expect(calls).toHaveLength(3);
  });

  it.each([aSession(null), aSession({ id: anId(2) })])(
    'sends nothing in the name of somebody else',
    async (session) => {
      queryClient.setQueryData(SESSION_KEY, aSession());
      const { calls } = fakeApi({
        'GET /api/session': session,
        'POST /api/x': new Refusal(403, 'csrf-failed'),
      });
      expect((await errorOf(apiSend('POST', '/api/x', named))).code).toBe('csrf-failed');
      expect(calls.map(({ route }) => route)).toEqual(['POST /api/x', 'GET /api/session']);
      expect(queryClient.getQueryData(SESSION_KEY)).toEqual(session);
    },
  );

  it('takes an answer that says nothing', async () => {
    queryClient.setQueryData(SESSION_KEY, aSession());
    fakeApi({ 'DELETE /api/x': undefined });
    const answering: Promise<unknown> = apiSend('DELETE', '/api/x', noAnswer);
    expect(await answering).toBeUndefined();
  });
});

describe('the query client', () => {
  it('asks who is signed in after a refusal for want of a session', async () => {
    const asked = vi.spyOn(queryClient, 'invalidateQueries');
    fakeApi({
      'GET /api/x': new Refusal(401, 'not-signed-in'),
      'GET /api/y': new Refusal(404, 'not-found'),
    });
    const fetching = (path: string) =>
      queryClient
        .query({ queryKey: [path], queryFn: () => apiGet(path, named) })
        .catch(() => undefined);
    await fetching('/api/y');
    expect(asked).not.toHaveBeenCalled();
    await fetching('/api/x');
    expect(asked).toHaveBeenCalledWith({ queryKey: SESSION_KEY });
  });
});

describe('apiPath', () => {
  it('makes values safe to stand in a path', () => {
    expect(apiPath`/api/links/${'a/b?c'}/${3}`).toBe('/api/links/a%2Fb%3Fc/3');
  });
});
