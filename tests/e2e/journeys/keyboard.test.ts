import { expect, inject } from 'vitest';
import { journey } from '../drivers/journey.ts';
import { tabTo } from '../drivers/keyboard.ts';

journey(
  'an assessor signs in, goes to the settings and out again without a mouse',
  async ({ visit }) => {
    const { page, open } = await visit();
    await open('/');
    await tabTo(page, 'textbox', 'E-mail');
    await page.keyboard.type('assessor@example.org');
    await tabTo(page, 'textbox', 'Password');
    await page.keyboard.type(inject('demo').password);
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'Waiting for you' }).waitFor();

    await page.keyboard.press('/');
    await page.keyboard.type('Settings Port Dogger');
    await page.getByRole('option', { name: 'Settings Port Dogger crossing' }).waitFor();
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'Port Dogger crossing', level: 1 }).waitFor();

    await tabTo(page, 'button', 'account and sign out');
    await page.keyboard.press('Enter');
    await tabTo(page, 'link', 'Account');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'Account', level: 1 }).waitFor();

    await tabTo(page, 'button', 'account and sign out');
    await page.keyboard.press('Enter');
    await tabTo(page, 'button', 'Sign out');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
    expect(new URL(page.url()).pathname).toBe('/sign-in');
  },
);
