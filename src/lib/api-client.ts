import { z } from 'zod';
import { apiCall } from './api-call.ts';
import { withCsrfToken } from './with-csrf-token.ts';

/** For answers that say nothing. */
export const noAnswer: z.ZodType<undefined> = z.undefined();

/** Fetches something. */
export function apiGet<T>(path: string, schema: z.ZodType<T>, signal?: AbortSignal): Promise<T> {
  return apiCall(path, schema, signal === undefined ? {} : { signal });
}

/** Changes something. */
export function apiSend<T>(
  method: 'POST' | 'PUT' | 'PATCH' | 'DELETE',
  path: string,
  schema: z.ZodType<T>,
  body?: unknown,
): Promise<T> {
  return withCsrfToken((token) => {
    if (body === undefined) return apiCall(path, schema, { method, headers: token });
    const headers = { ...token, 'Content-Type': 'application/json' };
    return apiCall(path, schema, { method, headers, body: JSON.stringify(body) });
  });
}
