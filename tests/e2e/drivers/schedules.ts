import { expect } from 'vitest';
import { printSchema, type EvidenceLayout } from '../../../shared/schemas/evidence.ts';
import {
  registerPageSchema,
  MOST_REGISTER_ROWS,
  type RegisterRow,
} from '../../../shared/schemas/register.ts';
import { answered, sent } from './api.ts';
import type { Visitor } from './visitor.ts';

const PATIENCE = { timeout: 90_000, interval: 200 };

/** Prints a run and waits for the file. */
export async function printOf(
  visitor: Visitor,
  { scheme, run }: { readonly scheme: string; readonly run: string },
  layout: EvidenceLayout,
): Promise<Buffer> {
  const asked = await sent(visitor, `${run}/prints`, { name: 'Schedule', layout });
  const print = `${scheme}/prints/${printSchema.parse(await asked.json()).id}`;
  const state = async () => printSchema.parse(await answered(visitor, print)).state;
  await expect.poll(state, PATIENCE).toBe('done');
  return (await visitor.page.request.get(`/api${print}/file`)).body();
}

/** All rows of the register by reference. */
export async function registerOf(visitor: Visitor, scheme: string) {
  const rows = new Map<string, RegisterRow>();
  for (let offset = 0; ; offset += MOST_REGISTER_ROWS) {
    const path = `${scheme}/register?offset=${offset}&limit=${MOST_REGISTER_ROWS}`;
    const page = registerPageSchema.parse(await answered(visitor, path));
    for (const row of page.rows) rows.set(row.reference, row);
    if (page.rows.length < MOST_REGISTER_ROWS) return rows;
  }
}

/** All that a run found, as it is exported. */
export async function exportOf({ page }: Visitor, run: string, format: 'xlsx' | 'geojson') {
  const answer = await page.request.get(`/api${run}/export?format=${format}`);
  expect(answer.status()).toBe(200);
  return answer.body();
}
