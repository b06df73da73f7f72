import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';
import { DESK, PHONE } from './visitor.ts';

const AXE = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/** What axe finds against a page: the rule and where it is broken. Our pages hold no frames to go into. */
export async function axeFaults(page: Page): Promise<string[]> {
  if (!(await page.evaluate(() => 'axe' in globalThis))) await page.evaluate(AXE);
  const results = await page.evaluate<AxeResults>('axe.run({ resultTypes: ["violations"] })');
  return results.violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target }) => `${id}: ${target.join(' ')}`),
  );
}

/** The same at a desk and on a phone, without opening the page again; it is left as it was. */
export async function axeFaultsAtBothSizes(page: Page): Promise<string[]> {
  const found: string[] = [];
  for (const [name, size] of Object.entries({ phone: PHONE, desk: DESK })) {
    await page.setViewportSize(size);
    found.push(...(await axeFaults(page)).map((fault) => `${name} ${fault}`));
  }
  return found;
}
