import { expect } from 'vitest';
import { journey } from '../drivers/journey.ts';
import { readLetterTo } from '../drivers/mailbox.ts';
import { choosePassword, invite } from '../drivers/people.ts';
import { DEMO_SCHEME, openScheme, tabs } from '../drivers/schemes.ts';
import { signInAs, signInWith, signOut } from '../drivers/sign-in.ts';

const PASSWORD = 'a lantern on the mole';

for (const [role, screens] of [
  ['Designer', ['Plan', 'Register', 'Measures', 'Owners', 'Evidence', 'Settings', 'Method']],
  [
    'Assessor',
    ['Plan', 'Register', 'Measures', 'Visits', 'Owners', 'Evidence', 'Settings', 'Method'],
  ],
  ['Witness', ['Plan', 'Register', 'Measures', 'Owners', 'Evidence', 'Settings', 'Method']],
  ['Owner', ['My building']],
] as const) {
  const email = `new-${role.toLowerCase()}@example.org`;
  journey(
    `an invited ${role} reads the letter, chooses a password and goes in`,
    async ({ visit }) => {
      const administrator = await visit();
      await signInAs(administrator, 'administrator');
      await invite(administrator, { name: `New ${role}`, email, scheme: DEMO_SCHEME, role });
      const { subject, link } = await readLetterTo(administrator, email);
      expect(subject).toBe(`Invitation to ${DEMO_SCHEME}`);

      const invited = await visit();
      await invited.open(link);
      await choosePassword(invited, PASSWORD, role === 'Owner');
      await openScheme(invited);
      expect(await tabs(invited)).toEqual(screens);

      // away from the map, whose tiles would be refused while it goes
      await invited.open('/account');
      await signOut(invited);
      await signInWith(invited, email, PASSWORD);
      await invited.page.getByRole('heading', { name: 'Account', level: 1 }).waitFor();
      await invited.open(link);
      await invited.page.getByRole('heading', { name: 'This link is spent' }).waitFor();
      invited.expectFault(/status of 410/);
    },
  );
}
