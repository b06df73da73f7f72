import { z } from 'zod';
import { alignmentsSchema } from '../../../shared/schemas/alignments.ts';
import {
  runCountsSchema,
  runDetailSchema,
  runSchema,
  runsSchema,
  type RunDetail,
} from '../../../shared/schemas/runs.ts';
import { answered, PATIENCE_MS, sent } from './api.ts';
import { mapIsStill } from './plan.ts';
import type { Visitor } from './visitor.ts';

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
export async function countsOfShownRun(visitor: Visitor, scheme: string) {
  const listed = shownRun.parse(await answered(visitor, `${scheme}/runs`));
  const run = listed.find(({ isShown }) => isShown);
  return withCounts.parse(await answered(visitor, `${scheme}/runs/${run?.id ?? ''}`)).counts;
}

/** Runs an option as its page would, with no map on the screen, and waits until the run has ended. */
async function runBeside(visitor: Visitor, scheme: string, option: string): Promise<string> {
  const { page } = visitor;
  const options = alignmentsSchema.parse(await answered(visitor, `${scheme}/alignments`));
  const chosen = options.find(({ name }) => name === option);
  const started = { alignmentId: chosen?.id, alignmentVersion: chosen?.version };
  const answer = await sent(visitor, `${scheme}/runs`, started);
  const { id } = runSchema.parse(await answer.json());
  // it is told how far the run is until it has ended
  await page.request.get(`/api${scheme}/runs/${id}/progress`, { timeout: PATIENCE_MS });
  return id;
}

/** A complete run of an option, which is started unless there is one already. */
export async function runOf(visitor: Visitor, scheme: string, option: string): Promise<RunDetail> {
  const runs = runsSchema.parse(await answered(visitor, `${scheme}/runs`));
  const done = runs.find((run) => run.option.name === option && run.state === 'complete');
  const id = done?.id ?? (await runBeside(visitor, scheme, option));
  return runDetailSchema.parse(await answered(visitor, `${scheme}/runs/${id}`));
}
