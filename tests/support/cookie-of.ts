import type { Response } from 'supertest';
import { z } from 'zod';

const cookies = z.array(z.string()).min(1);

/** The cookie that an answer sets, with its attributes. */
export function cookieOf({ headers }: Response): string {
  const found = cookies.parse(z.object({ 'set-cookie': cookies }).parse(headers)['set-cookie']);
  return found[0] ?? '';
}
