import { describe, expect } from 'vitest';
import { axeFaultsAtBothSizes } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { openScheme } from '../drivers/schemes.ts';
import { signInAs } from '../drivers/sign-in.ts';
import type { Visitor } from '../drivers/visitor.ts';

/** Opens pages one after the other and asks axe about each, at a desk and on a phone, once it has settled. */
async function faultsOn({ page, open }: Visitor, paths: readonly string[]): Promise<string[]> {
  const faults: string[] = [];
  for (const path of paths) {
    await open(path);
    await page.waitForLoadState('networkidle');
    await page.getByRole('heading', { level: 1 }).first().waitFor();
    faults.push(...(await axeFaultsAtBothSizes(page)).map((fault) => `${path} ${fault}`));
  }
  return faults;
}

describe('axe finds nothing', () => {
  journey('before signing in', async ({ visit }) => {
    const visitor = await visit();
    const paths = ['/sign-in', '/forgot-password', '/links/of-nobody'];
    expect(await faultsOn(visitor, paths)).toEqual([]);
    visitor.expectFault(/status of 4\d\d/);
  });

  journey('for the administrator', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'administrator');
    const scheme = await openScheme(visitor);
    const settings = ['', '/people', '/rules', '/background'].map(
      (end) => `${scheme}/settings${end}`,
    );
    const paths = ['/', '/people', '/audit', '/mailbox', '/account', '/schemes/new', '/nowhere'];
    expect(await faultsOn(visitor, [...paths, ...settings, `${scheme}/plan`])).toEqual([]);
  });

  journey('for the owner', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'owner');
    const scheme = await openScheme(visitor);
    expect(
      await faultsOn(visitor, ['/', '/account', `${scheme}/home`, `${scheme}/settings`]),
    ).toEqual([]);
  });
});
