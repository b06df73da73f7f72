import { expect } from 'vitest';
import { journey } from '../drivers/journey.ts';
import { readLetterTo } from '../drivers/mailbox.ts';
import { choosePassword, invite } from '../drivers/people.ts';
import { DEMO_SCHEME, openScheme, tabs } from '../drivers/schemes.ts';
import { signInAs, signInWith, signOut } from '../drivers/sign-in.ts';
import type { Visitor } from '../drivers/visitor.ts';

const PASSWORD = 'a lantern on the mole';
const ABOUT_THE_TOWN = ['Plan', 'Register', 'Measures', 'Owners', 'Evidence', 'Settings', 'Method'];

const SCREENS = {
  Designer: ABOUT_THE_TOWN,
  Assessor: ABOUT_THE_TOWN.toSpliced(3, 0, 'Visits'),
  Witness: ABOUT_THE_TOWN,
  Owner: ['My building'],
};

/** Goes in by the link of an invitation, out, and in again by the password that was chosen. */
async function goIn(
  invited: Visitor,
  role: string,
  email: string,
  link: string,
): Promise<string[]> {
  await invited.open(link);
  await choosePassword(invited, PASSWORD, role === 'Owner');
  await openScheme(invited);
  const screens = await tabs(invited);

  // away from the map, whose tiles would be refused while it goes
  await invited.open('/account');
  await signOut(invited);
  await signInWith(invited, email, PASSWORD);
  await invited.page.getByRole('heading', { name: 'Account', level: 1 }).waitFor();
  await invited.open(link);
  await invited.page.getByRole('heading', { name: 'This link is spent' }).waitFor();
  invited.expectFault(/status of 410/);
  return screens;
}

journey('who is invited reads the letter, chooses a password and goes in', async ({ visit }) => {
  const administrator = await visit();
  await signInAs(administrator, 'administrator');
  for (const [role, screens] of Object.entries(SCREENS)) {
    const email = `new-${role.toLowerCase()}@example.org`;
    await invite(administrator, { name: `New ${role}`, email, scheme: DEMO_SCHEME, role });
    const { subject, link } = await readLetterTo(administrator, email);
    expect(subject).toBe(`Invitation to ${DEMO_SCHEME}`);
    const invited = await visit();
    expect([role, await goIn(invited, role, email, link)]).toEqual([role, screens]);
    await invited.leave();
  }
});
