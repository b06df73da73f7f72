import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type Axe from 'axe-core';
import type { AxeResults, RunOptions } from 'axe-core';
import type { Page } from 'playwright-core';
import { DESK, PHONE, type Visitor } from './visitor.ts';

const AXE = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

type Faults = Promise<string[]>;

async function faultsOf(page: Page, options: RunOptions): Faults {
  if (!(await page.evaluate(() => 'axe' in globalThis))) await page.evaluate(AXE);
  const results = await page.evaluate<AxeResults, RunOptions>(
    (asked) => (globalThis as unknown as { axe: typeof Axe }).axe.run(asked),
    { resultTypes: ['violations'], ...options },
  );
  return results.violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target }) => `${id}: ${target.join(' ')}`),
  );
}

/** What axe finds against a page: the rule and where it is broken. Our pages hold no frames to go into. */
export function axeFaults(page: Page): Faults {
  return faultsOf(page, {});
}

/**
 * The same at a desk and on a phone, without opening the page again; it is left as it was. Colours, which are
 * most of the work, are those of the desk on a phone too.
 */
export async function axeFaultsAtBothSizes(page: Page): Faults {
  await page.setViewportSize(PHONE);
  const onPhone = await faultsOf(page, { rules: { 'color-contrast': { enabled: false } } });
  await page.setViewportSize(DESK);
  const atDesk = await faultsOf(page, {});
  return [...onPhone.map((fault) => `phone ${fault}`), ...atDesk.map((fault) => `desk ${fault}`)];
}

/** Opens pages one after the other and asks axe about each at both sizes, once it has settled. */
export async function axeFaultsOn({ page, open }: Visitor, paths: readonly string[]): Faults {
  const faults: string[] = [];
  for (const path of paths) {
    await open(path);
    await page.waitForLoadState('networkidle');
    await page.getByRole('heading', { level: 1 }).first().waitFor();
    faults.push(...(await axeFaultsAtBothSizes(page)).map((fault) => `${path} ${fault}`));
  }
  return faults;
}
