import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { DESK, PHONE } from './visitor.ts';

/** What axe finds against a page: the rule and where it is broken. Our pages hold no frames to go into. */
export async function axeFaults(page: Page): Promise<string[]> {
  const axe = new AxeBuilder({ page }).setLegacyMode().options({ resultTypes: ['violations'] });
  const { violations } = await axe.analyze();
  return violations.flatMap(({ id, nodes }) =>
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
