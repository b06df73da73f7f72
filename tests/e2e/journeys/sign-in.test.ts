import { describe, expect, inject } from 'vitest';
import { journey } from '../drivers/journey.ts';
import { rowOf } from '../drivers/register.ts';
import { DEMO_SCHEME, openScheme, tabs } from '../drivers/schemes.ts';
import { signInAs, signInWith, signOut } from '../drivers/sign-in.ts';

describe('signing in', () => {
  journey('as the administrator opens people, audit and mailbox', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'administrator');
    expect(await tabs(visitor)).toEqual(['Schemes', 'People', 'Audit', 'Mailbox', 'Method']);
    await openScheme(visitor);
    expect(await tabs(visitor)).toEqual([
      ...['Plan', 'Register', 'Measures', 'Owners', 'Evidence', 'Settings', 'Method'],
    ]);
    await visitor.page.getByRole('link', { name: 'Register', exact: true }).click();
    await rowOf(visitor, 'B0001').waitFor();
  });

  for (const role of ['designer', 'assessor', 'second-assessor', 'witness'] as const) {
    journey(`as ${role} leads to the scheme and its plan`, async ({ visit }) => {
      const visitor = await visit();
      await signInAs(visitor, role);
      await visitor.page.getByRole('link', { name: DEMO_SCHEME }).waitFor();
      expect(await tabs(visitor)).toEqual(['Schemes', 'Method']);
      await openScheme(visitor);
      expect(visitor.page.url()).toMatch(/\/plan$/);
    });
  }

  journey(
    'as the owner opens their own building, and neither plan nor register',
    async ({ visit }) => {
      const visitor = await visit();
      await signInAs(visitor, 'owner');
      const scheme = await openScheme(visitor);
      expect(await tabs(visitor)).toEqual(['My building']);
      const answer = await visitor.page.request.get(`/api${scheme}/buildings?search=B0001`);
      expect(answer.status()).toBe(403);
    },
  );

  journey(
    'with a wrong password is refused, and which was wrong is not told',
    async ({ visit }) => {
      const visitor = await visit();
      await visitor.open('/');
      const refusal = visitor.page.getByText('E-mail or password is not right.');
      for (const email of ['designer@example.org', 'nobody@example.org']) {
        await signInWith(visitor, email, 'not the password');
        await refusal.waitFor();
        visitor.expectFault(/status of 401/);
        await visitor.page.reload();
      }
      await visitor.page.getByRole('heading', { name: 'Sign in' }).waitFor();
    },
  );

  journey('leads to where one wanted to go, and out again', async ({ visit }) => {
    const visitor = await visit();
    await visitor.open('/account');
    await signInWith(visitor, 'witness@example.org', inject('demo').password);
    await visitor.page.getByRole('heading', { name: 'Account' }).waitFor();
    await signOut(visitor);
  });
});
