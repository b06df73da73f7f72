import type { APIResponse } from 'playwright-core';
import { sessionSchema } from '../../../shared/schemas/session.ts';
import type { Visitor } from './visitor.ts';

/** Working out a town takes its time where others work too. */
export const PATIENCE_MS = 90_000;

/** What the server answers to a question of the application, by its path after `/api`. */
export async function answered({ page }: Visitor, path: string): Promise<unknown> {
  const answer = await page.request.get(`/api${path}`, { timeout: PATIENCE_MS });
  if (!answer.ok()) throw new Error(`${path} was not answered: ${await answer.text()}`);
  return answer.json();
}

/** The server's answer where something is sent to it, as the application would send it; none that refuses. */
export async function sent(
  visitor: Visitor,
  path: string,
  data: unknown,
  method: 'POST' | 'PATCH' = 'POST',
): Promise<APIResponse> {
  const { csrfToken } = sessionSchema.parse(await answered(visitor, '/session'));
  const headers = { 'X-CSRF-Token': csrfToken };
  const answer = await visitor.page.request.fetch(`/api${path}`, { method, headers, data });
  if (!answer.ok()) throw new Error(`${path} was refused: ${await answer.text()}`);
  return answer;
}
