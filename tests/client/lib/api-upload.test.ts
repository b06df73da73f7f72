import { describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { apiUpload } from '../../../src/lib/api-upload.ts';

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
  setRequestHeader(name: string): void {
    this.opened.push(name);
  }
  send(form: FormData): void {
    this.opened.push(String(form.has('file')));
  }
  abort(): void {
    this.onabort?.();
  }
}

function upload() {
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
  const request = FakeRequest.made.at(-1);
  if (request === undefined) throw new Error('No request was made.');
  return { request, answer, controller, onProgress };
}

describe('apiUpload', () => {
  it('sends the file, tells how much has gone and gives the answer', async () => {
    const { request, answer, onProgress } = upload();
    expect(request.opened).toEqual(['PUT /api/background/water', 'true']);
    request.upload.onprogress?.({ loaded: 1, total: 4 });
    expect(onProgress).toHaveBeenCalledWith({ sent: 1, total: 4 });
    request.status = 200;
    request.responseText = '{"features": 12}';
    request.onload?.();
    expect(await answer).toEqual({ features: 12 });
  });

  it('throws what the server refuses with', async () => {
    const { request, answer } = upload();
    request.status = 422;
    request.responseText =
      '{"error": {"code": "unreadable", "message": "No GeoJSON.", "fields": []}}';
    request.onload?.();
    await expect(answer).rejects.toMatchObject({ code: 'unreadable', message: 'No GeoJSON.' });
  });

  it('says that there is no server', async () => {
    const { request, answer } = upload();
    request.onerror?.();
    await expect(answer).rejects.toMatchObject({ code: 'unreachable' });
  });

  it('can be cancelled', async () => {
    const { answer, controller } = upload();
    controller.abort();
    await expect(answer).rejects.toMatchObject({ name: 'AbortError' });
  });
});
