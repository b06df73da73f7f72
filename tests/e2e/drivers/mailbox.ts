import type { Visitor } from './visitor.ts';

/** Opens the newest letter to somebody, and gives its subject and where its link leads. */
export async function readLetterTo(
  { page, open }: Visitor,
  email: string,
): Promise<{ subject: string; link: string }> {
  await open('/mailbox');
  await page.getByRole('link', { name: email }).first().click();
  const subject = await page.getByRole('heading', { level: 2 }).textContent();
  const letter = page.getByRole('region', { name: 'The letter as text' });
  const link = await letter.getByRole('link').first().getAttribute('href');
  return { subject: subject ?? '', link: link ?? '' };
}
