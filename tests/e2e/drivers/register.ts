import type { Locator } from 'playwright-core';
import { addressOf } from './schemes.ts';
import type { Visitor } from './visitor.ts';

/** Opens the register of the demo scheme and waits for its rows. */
export async function openRegister(visitor: Visitor): Promise<void> {
  await visitor.open(`${await addressOf(visitor)}/register`);
  await rowOf(visitor, 'B0001').waitFor();
}

/** The row of a building, by its reference. */
export function rowOf({ page }: Visitor, reference: string): Locator {
  return page.getByRole('row').filter({ hasText: reference });
}

/** Waits until the register says how many there are. */
export async function countIs({ page }: Visitor, words: RegExp): Promise<string> {
  const count = page.getByRole('status').filter({ hasText: words }).first();
  await count.waitFor();
  return (await count.textContent()) ?? '';
}

/** Opens a chip of the filter and ticks a word. */
export async function filterBy(visitor: Visitor, chip: string, word: string): Promise<void> {
  const { page } = visitor;
  await page.getByRole('button', { name: new RegExp(`^${chip}: `) }).click();
  await page.getByRole('checkbox', { name: word, exact: true }).check();
  await page.keyboard.press('Escape');
}

/** Presses keys one after the other, as somebody does who reads in between. */
export async function press({ page }: Visitor, ...keys: readonly string[]): Promise<void> {
  for (const key of keys) await page.keyboard.press(key);
}

/** The building that is opened beside the table. */
export function openedOf({ page }: Visitor): Locator {
  return page.getByRole('region', { name: 'Opened building' });
}
