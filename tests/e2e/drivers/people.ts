import { isIn } from './sign-in.ts';
import type { Visitor } from './visitor.ts';

export type Invitation = {
  readonly name: string;
  readonly email: string;
  readonly scheme: string;
  readonly role: string;
};

/** Invites a person from the page of people. */
export async function invite({ page, open }: Visitor, invitation: Invitation): Promise<void> {
  await open('/people');
  await page.getByLabel('Name').fill(invitation.name);
  await page.getByLabel('E-mail').fill(invitation.email);
  await page.getByLabel('Scheme', { exact: true }).selectOption(invitation.scheme);
  await page.getByLabel('Role', { exact: true }).selectOption(invitation.role);
  await page.getByRole('button', { name: 'Send the invitation' }).click();
  await page.getByText(`The invitation to ${invitation.email} is on its way.`).waitFor();
}

/** Chooses a password on the page that a link has opened, and goes in. */
export async function choosePassword(
  visitor: Visitor,
  password: string,
  asOwner = false,
): Promise<void> {
  const { page } = visitor;
  // nobody types a password before the page has its session
  await page.waitForLoadState('networkidle');
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Set the password and go in' }).click();
  await isIn(visitor, asOwner);
}
