import type { Visitor } from './visitor.ts';

export const DEMO_SCHEME = 'Port Dogger crossing';

/** Opens a scheme from the first page, unless an owner is there already, and gives its address. */
export async function openScheme({ page }: Visitor, name = DEMO_SCHEME): Promise<string> {
  if (!page.url().endsWith('/home')) await page.getByRole('link', { name }).click();
  await page.waitForURL(/\/schemes\/[0-9a-f-]{36}\/\w+/);
  return /\/schemes\/[0-9a-f-]{36}/.exec(page.url())?.[0] ?? '';
}

/** The address of a scheme on the first page, which is not left. */
export async function addressOf({ page }: Visitor, name = DEMO_SCHEME): Promise<string> {
  const link = await page.getByRole('link', { name }).getAttribute('href');
  return /\/schemes\/[0-9a-f-]{36}/.exec(link ?? '')?.[0] ?? '';
}

/** The words of the tabs across the top. */
export function tabs({ page }: Visitor): Promise<string[]> {
  return page.getByRole('navigation', { name: 'Screens' }).getByRole('link').allTextContents();
}
