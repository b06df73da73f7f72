import type { Locator } from 'playwright-core';
import { expect } from 'vitest';
import { openScheme } from './schemes.ts';
import type { Visitor } from './visitor.ts';

/** Drawing by software takes its time. */
const PATIENCE_MS = 60_000;

export function mapOf({ page }: Visitor): Locator {
  return page.getByRole('region', { name: /^Map of / });
}

/** Waits until the map has drawn all that it was asked to show. */
export async function mapIsStill({ page }: Visitor): Promise<void> {
  await page.locator('[aria-busy="false"]').waitFor({ timeout: PATIENCE_MS });
}

/** Opens the plan of the demo scheme and waits for its map. */
export async function openPlan(visitor: Visitor): Promise<string> {
  const scheme = await openScheme(visitor);
  await mapIsStill(visitor);
  return scheme;
}

/** Shows the register alone, without an option and what a run of it found. */
export async function showNoOption(visitor: Visitor): Promise<void> {
  const { page } = visitor;
  await page.getByRole('button', { name: /choose another option$/ }).click();
  await page.getByRole('button', { name: 'No option', exact: true }).click();
  await page.getByText('Nothing worked out yet').waitFor();
  await mapIsStill(visitor);
}

/** What the side of the map says is selected. */
export function selectedName({ page }: Visitor): Promise<string | null> {
  const headings = page.getByRole('complementary').getByRole('heading', { level: 2 });
  // the option of the line stands under it
  return headings.first().textContent();
}

/** Waits until the side of the map shows a building. */
export async function isSelected(visitor: Visitor, name: string): Promise<void> {
  const side = visitor.page.getByRole('complementary');
  await side.getByRole('heading', { name, exact: true }).waitFor();
  await mapIsStill(visitor);
}

/** Writes into the search and waits for what is found. */
export async function search({ page }: Visitor, words: string): Promise<string[]> {
  await page.getByRole('combobox', { name: 'Find a building' }).fill(words);
  const options = page.getByRole('option');
  await options.first().waitFor();
  return options.allTextContents();
}

/** A fact at the side of the map. */
export function factOf({ page }: Visitor, label: string): Promise<string | null> {
  return page.getByRole('term').filter({ hasText: label }).locator('..').textContent();
}

/** Waits until the middle of the map looks otherwise than in a picture of it. */
export async function middleChanges(visitor: Visitor, picture: string): Promise<void> {
  await expect.poll(() => middleOf(visitor), { timeout: PATIENCE_MS }).not.toBe(picture);
}

/** A picture of the middle of the map, to see whether something there changed. */
export async function middleOf(visitor: Visitor): Promise<string> {
  const box = await mapOf(visitor).boundingBox();
  if (box === null) throw new Error('The map is not to be seen.');
  const [x, y] = [box.x + box.width / 2 - 60, box.y + box.height / 2 - 60];
  // what was changed before is painted in the next frame, and seen in the one after
  await visitor.page.evaluate(async () => {
    for (let frame = 0; frame < 2; frame += 1) await new Promise(requestAnimationFrame);
  });
  const picture = await visitor.page.screenshot({ clip: { x, y, width: 120, height: 120 } });
  return picture.toString('base64');
}
