import { z } from 'zod';
import { runCountsSchema } from '../../../shared/schemas/runs.ts';
import { mapIsStill } from './plan.ts';
import type { Visitor } from './visitor.ts';

/** Working out a town takes its time where others work too. */
const PATIENCE_MS = 90_000;

/** Runs the option that is shown, and waits until the map shows what was found. */
export async function runOption(visitor: Visitor): Promise<void> {
  const { page } = visitor;
  await page.getByRole('button', { name: 'Run', exact: true }).click();
  await page.getByText(/^Run \d+ is complete/).waitFor({ timeout: PATIENCE_MS });
  await page.getByRole('region', { name: 'Legend' }).getByRole('table').waitFor();
  await mapIsStill(visitor);
}

/** The last figures of the lines of the legend: how many buildings take each colour. */
export async function legendCounts({ page }: Visitor): Promise<number[]> {
  const rows = page.getByRole('region', { name: 'Legend' }).getByRole('row');
  await rows.first().waitFor();
  const counts = await rows.locator('td:last-child').allTextContents();
  return counts.map((text) => Number(text.replaceAll('\u2009', '')));
}

/** Shows categories at an end of the likely range. */
export async function showEnd({ page }: Visitor, name: 'Low' | 'Central' | 'High'): Promise<void> {
  await page.getByRole('button', { name, exact: true }).click();
  await page.locator(`[aria-pressed="true"]`, { hasText: name }).waitFor();
}

const shownRun = z.array(z.looseObject({ id: z.string(), isShown: z.boolean() }));
const withCounts = z.looseObject({ counts: runCountsSchema });

/** What the server counts of the run that is shown. */
export async function countsOfShownRun({ page }: Visitor, scheme: string) {
  const listed = await page.request.get(`/api${scheme}/runs`);
  const run = shownRun.parse(await listed.json()).find(({ isShown }) => isShown);
  const detail = await page.request.get(`/api${scheme}/runs/${run?.id ?? ''}`);
  return withCounts.parse(await detail.json()).counts;
}
