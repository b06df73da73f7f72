import { describe, expect } from 'vitest';
import { axeFaultsOn } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { signInAs } from '../drivers/sign-in.ts';

describe('axe finds nothing', () => {
  journey('before signing in', async ({ visit }) => {
    const visitor = await visit();
    const paths = ['/sign-in', '/forgot-password', '/links/of-nobody'];
    expect(await axeFaultsOn(visitor, paths)).toEqual([]);
    visitor.expectFault(/status of 4\d\d/);
  });

  journey('on what the administrator has of every scheme', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'administrator');
    const paths = ['/', '/people', '/audit', '/mailbox', '/account', '/schemes/new', '/nowhere'];
    expect(await axeFaultsOn(visitor, paths)).toEqual([]);
  });
});
