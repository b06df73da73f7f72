import type { z } from 'zod';
import { readAnswer } from './api-call.ts';
import { unreachableError } from './api-error.ts';
import { withCsrfToken } from './with-csrf-token.ts';

export type UploadProgress = { readonly sent: number; readonly total: number };

export type Upload<T> = {
  readonly path: string;
  readonly method?: 'POST' | 'PUT';
  readonly file: File;
  readonly schema: z.ZodType<T>;
  readonly signal: AbortSignal;
  readonly onProgress: (progress: UploadProgress) => void;
};

function asJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}

function send<T>(
  { path, method = 'PUT', file, schema, signal, onProgress }: Upload<T>,
  headers: Readonly<Record<string, string>>,
): Promise<T> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    const form = new FormData();
    form.append('file', file);
    request.open(method, path);
    for (const [name, value] of Object.entries(headers)) request.setRequestHeader(name, value);
    request.upload.onprogress = ({ loaded, total }) => {
      onProgress({ sent: loaded, total });
    };
    request.onload = () => {
      const answer = request.status === 204 ? undefined : asJson(request.responseText);
      try {
        resolve(readAnswer(schema, request.status, answer));
      } catch (error) {
        reject(error instanceof Error ? error : unreachableError());
      }
    };
    request.onerror = () => {
      reject(unreachableError());
    };
    request.onabort = () => {
      reject(new DOMException('The upload was cancelled.', 'AbortError'));
    };
    signal.addEventListener('abort', () => {
      request.abort();
    });
    request.send(form);
  });
}

/** Sends a file and says how much of it has gone, which fetch cannot. */
export function apiUpload<T>(upload: Upload<T>): Promise<T> {
  return withCsrfToken((token) => {
    // it may have been cancelled while the token was waited for
    upload.signal.throwIfAborted();
    return send(upload, token);
  });
}
