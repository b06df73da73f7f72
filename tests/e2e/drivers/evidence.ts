import { readFile } from 'node:fs/promises';
import type { Locator } from 'playwright-core';
import type { Visitor } from './visitor.ts';

/** Drawing a sheet takes its time where others work too. */
const PATIENCE_MS = 60_000;

/** The sheet on the page of evidence, once it is drawn. */
export async function sheetOnScreen({ page }: Visitor): Promise<Locator> {
  const sheet = page.getByRole('application', { name: /move the frame/ });
  await sheet.waitFor({ timeout: PATIENCE_MS });
  return sheet;
}

/** Downloads what is printed in some part of the page once it is done: its name, and how it begins. */
export async function downloadedPdf(
  part: Locator,
  { page }: Visitor,
): Promise<{ readonly name: string; readonly start: string }> {
  const link = part.getByRole('link', { name: 'Download PDF' });
  await link.waitFor({ timeout: PATIENCE_MS });
  const begun = page.waitForEvent('download');
  await link.click();
  const download = await begun;
  const file = await readFile(await download.path());
  return { name: download.suggestedFilename(), start: file.subarray(0, 4).toString('latin1') };
}
