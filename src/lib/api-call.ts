import type { z } from 'zod';
import { ApiError, refusedError, unreachableError } from './api-error.ts';

const NO_CONTENT = 204;

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

/** Asks the server, and gives its answer as the shared schema has it. */
export async function apiCall<T>(
  path: string,
  schema: z.ZodType<T>,
  init: RequestInit = {},
): Promise<T> {
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
