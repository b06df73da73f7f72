import { inject } from 'vitest';
import { sent } from './api.ts';
import type { Visitor } from './visitor.ts';

export type DemoRole =
  'administrator' | 'designer' | 'assessor' | 'second-assessor' | 'owner' | 'witness';

/** Fills in the form of the sign-in page, where the visitor stands, and sends it. */
export async function signInWith(
  { page }: Visitor,
  email: string,
  password: string,
): Promise<void> {
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

/** Waits for the first page: what waits for somebody, or the building of an owner. */
export async function isIn({ page }: Visitor, asOwner: boolean): Promise<void> {
  await (
    asOwner
      ? page.getByRole('link', { name: 'My building' })
      : page.getByRole('heading', { name: 'Waiting for you' })
  ).waitFor();
}

/** Signs a person of the demo in, as the sign-in page would, and waits for their first page. */
export async function signInAs(visitor: Visitor, role: DemoRole): Promise<void> {
  const { password } = inject('demo');
  await sent(visitor, '/session', { email: `${role}@example.org`, password });
  await visitor.open('/');
  await isIn(visitor, role === 'owner');
}

export async function signOut({ page }: Visitor): Promise<void> {
  await page.getByRole('button', { name: 'account and sign out' }).click();
  await page.getByRole('button', { name: 'Sign out', exact: true }).click();
  await page.getByRole('heading', { name: 'Sign in' }).waitFor();
}
