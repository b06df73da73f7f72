import type { Page } from 'playwright-core';

const MOST_STOPS = 60;

/** Presses Tab until something is in focus, as whoever has no mouse does. */
export async function tabTo(
  page: Page,
  role: 'button' | 'link' | 'textbox' | 'combobox' | 'region',
  name: string,
) {
  const wanted = page.getByRole(role, { name });
  for (let stop = 0; stop < MOST_STOPS; stop += 1) {
    await page.keyboard.press('Tab');
    if (await wanted.evaluateAll((found) => found.includes(document.activeElement as never)))
      return;
  }
  throw new Error(`Tab does not reach the ${role} "${name}".`);
}
