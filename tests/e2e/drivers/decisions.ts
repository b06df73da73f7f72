import type { Locator } from 'playwright-core';
import { countIs } from './register.ts';
import type { Visitor } from './visitor.ts';

/** The counts by stage and state over the register. */
export function funnelOf({ page }: Visitor): Locator {
  return page.getByRole('navigation', { name: 'Stages and states' });
}

/** Marks all that the register finds now; tells how many those are. */
export async function markAllFound(visitor: Visitor): Promise<number> {
  const { page } = visitor;
  const words = await countIs(visitor, /^[\d\s]+ of [\d\s]+ buildings$/);
  await page.getByRole('checkbox', { name: /all/i }).first().check();
  await page.getByRole('button', { name: 'Decide…' }).waitFor();
  return Number(words.split(' of ')[0]?.replaceAll(/\s/g, ''));
}

/** The decision that stands first on a sheet. */
export function decisionOf({ page }: Visitor): Locator {
  return page.getByRole('region', { name: 'Decision' }).getByRole('article').first();
}

/** Prepares a decision on the sheet that is open. */
export async function decideOnSheet(
  { page }: Visitor,
  decision: { readonly kind: string; readonly reason: string },
): Promise<void> {
  await page.getByRole('button', { name: 'Decide…' }).click();
  const dialog = page.getByRole('dialog', { name: /^Decide for / });
  await dialog.getByRole('combobox', { name: 'Decision' }).selectOption({ label: decision.kind });
  await dialog.getByRole('textbox', { name: 'Reason' }).fill(decision.reason);
  await dialog.getByRole('button', { name: 'Prepare for check' }).click();
  await dialog.waitFor({ state: 'detached' });
}
