import { z } from 'zod';
import { sessionSchema } from '../../shared/schemas/session.ts';
import { ApiError, refusedError, unreachableError } from './api-error.ts';
import { queryClient, SESSION_KEY } from './query-client.ts';

const withToken = sessionSchema.pick({ csrfToken: true }).strip();
const NO_CONTENT = 204;

/** For answers that say nothing. */
export const noAnswer: z.ZodType<undefined> = z.undefined();

/** The token that goes with every change, from the session that was fetched. */
export function csrfHeaders(): Record<string, string> {
  const session = withToken.safeParse(queryClient.getQueryData(SESSION_KEY));
  return session.success ? { 'X-CSRF-Token': session.data.csrfToken } : {};
}

/** What the server answered, as the shared schema has it; a refusal is thrown. */
export function readAnswer<T>(schema: z.ZodType<T>, status: number, answer: unknown): T {
  if (status >= 400 || status === 0) throw refusedError(status, answer);
  const parsed = schema.safeParse(answer);
  if (parsed.success) return parsed.data;
  const places = parsed.error.issues.map(({ path, message }) => `${path.join('.')}: ${message}`);
  throw new ApiError(
    'unexpected-answer',
    `The server gave an answer that makes no sense (${places.slice(0, 3).join('; ')}).`,
    status,
  );
}

async function call<T>(path: string, schema: z.ZodType<T>, init: RequestInit): Promise<T> {
  let response: Response;
  try {
    response = await fetch(path, { credentials: 'same-origin', ...init });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw unreachableError();
  }
  const answer: unknown =
    response.status === NO_CONTENT ? undefined : await response.json().catch(() => null);
  return readAnswer(schema, response.status, answer);
}

/** Fetches something. */
export function apiGet<T>(path: string, schema: z.ZodType<T>, signal?: AbortSignal): Promise<T> {
  return call(path, schema, signal === undefined ? {} : { signal });
}

/** Changes something. */
export function apiSend<T>(
  method: 'POST' | 'PUT' | 'PATCH' | 'DELETE',
  path: string,
  schema: z.ZodType<T>,
  body?: unknown,
): Promise<T> {
  if (body === undefined) return call(path, schema, { method, headers: csrfHeaders() });
  const headers = { ...csrfHeaders(), 'Content-Type': 'application/json' };
  return call(path, schema, { method, headers, body: JSON.stringify(body) });
}
