import { describe, expect } from 'vitest';
import { axeFaultsOn } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { addressOf, openScheme } from '../drivers/schemes.ts';
import { signInAs } from '../drivers/sign-in.ts';

describe('axe finds nothing', () => {
  journey('on what the administrator has of a scheme', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'administrator');
    const scheme = await addressOf(visitor);
    const ends = ['settings', 'settings/people', 'settings/rules', 'settings/background', 'plan'];
    const paths = ends.map((end) => `${scheme}/${end}`);
    expect(await axeFaultsOn(visitor, paths)).toEqual([]);
  });

  journey('on what an owner has', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'owner');
    const scheme = await openScheme(visitor);
    const paths = ['/', '/account', `${scheme}/home`, `${scheme}/settings`];
    expect(await axeFaultsOn(visitor, paths)).toEqual([]);
  });
});
