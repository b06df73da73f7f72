import { describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { apiUpload } from '../../../src/lib/api-upload.ts';
import { queryClient, SESSION_KEY } from '../../../src/lib/query-client.ts';
import { aSession } from '../../support/answers.ts';
import { fakeApi } from '../../support/fake-api.ts';

const schema = z.object({ features: z.number() });

/** A request that a test answers when it wants. */
class FakeRequest {
  static readonly made: FakeRequest[] = [];
  readonly upload: { onprogress?: (event: { loaded: number; total: number }) => void } = {};
  status = 0;
  responseText = '';
  onload?: () => void;
  onerror?: () => void;
  onabort?: () => void;
  readonly opened: string[] = [];
  constructor() {
    FakeRequest.made.push(this);
  }
  open(method: string, path: string): void {
    this.opened.push(`${method} ${path}`);
  }
  setRequestHeader(name: string, value: string): void {
    this.opened.push(`${name}: ${value}`);
  }
  send(form: FormData): void {
    this.opened.push(String(form.has('file')));
  }
  abort(): void {
    this.onabort?.();
  }
}

function begin() {
  vi.stubGlobal('XMLHttpRequest', FakeRequest);
  const controller = new AbortController();
  const onProgress = vi.fn();
  const file = new File(['x'], 'water.zip');
  const answer = apiUpload({
    path: '/api/background/water',
    file,
    schema,
    signal: controller.signal,
    onProgress,
  });
  return { answer, controller, onProgress };
}

function requestOf(made: number): Promise<FakeRequest> {
  return vi.waitFor(() => {
    const request = FakeRequest.made[made];
    if (request === undefined) throw new Error('No request was made.');
    return request;
  });
}

async function upload() {
  queryClient.setQueryData(SESSION_KEY, aSession());
  const made = FakeRequest.made.length;
  const begun = begin();
  return { ...begun, request: await requestOf(made) };
}

describe('apiUpload', () => {
  it('sends the file, tells how much has gone and gives the answer', async () => {
    const { request, answer, onProgress } = await upload();
    expect(request.opened).toEqual(['PUT /api/background/water', 'X-CSRF-Token: token', 'true']);
    request.upload.onprogress?.({ loaded: 1, total: 4 });
    expect(onProgress).toHaveBeenCalledWith({ sent: 1, total: 4 });
    request.status = 200;
    request.responseText = '{"features": 12}';
    request.onload?.();
    expect(await answer).toEqual({ features: 12 });
  });

  it('throws what the server refuses with', async () => {
    const { request, answer } = await upload();
    request.status = 422;
    request.responseText =
      '{"error": {"code": "unreadable", "message": "No GeoJSON.", "fields": []}}';
    request.onload?.();
    await expect(answer).rejects.toMatchObject({ code: 'unreadable', message: 'No GeoJSON.' });
  });

  it('sends the file again where another window has renewed the session', async () => {
    const { request, answer } = await upload();
    fakeApi({ 'GET /api/session': { ...aSession(), csrfToken: 'renewed' } });
    request.status = 403;
    request.responseText =
      '{"error": {"code": "csrf-failed", "message": "Out of date.", "fields": []}}';
    const made = FakeRequest.made.length;
    request.onload?.();
    const again = await requestOf(made);
    expect(again.opened).toContain('X-CSRF-Token: renewed');
    again.status = 200;
    again.responseText = '{"features": 12}';
    again.onload?.();
    expect(await answer).toEqual({ features: 12 });
  });

  it('sends nothing once it is cancelled while the token is waited for', async () => {
    fakeApi({ 'GET /api/session': aSession() });
    const made = FakeRequest.made.length;
    const { answer, controller } = begin();
    controller.abort();
    await expect(answer).rejects.toMatchObject({ name: 'AbortError' });
    expect(FakeRequest.made).toHaveLength(made);
  });

  it('says that there is no server', async () => {
    const { request, answer } = await upload();
    request.onerror?.();
    await expect(answer).rejects.toMatchObject({ code: 'unreachable' });
  });

  it('can be cancelled', async () => {
    const { answer, controller } = await upload();
    controller.abort();
    await expect(answer).rejects.toMatchObject({ name: 'AbortError' });
  });
});
