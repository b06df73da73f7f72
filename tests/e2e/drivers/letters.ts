import type { Visitor } from './visitor.ts';

/** Prepares the first information to everybody whom the rules name, and gives the address of the batch. */
export async function prepareLetters({ page, open }: Visitor, scheme: string): Promise<string> {
  await open(`${scheme}/owners/letters`);
  await page.getByRole('link', { name: 'Prepare letters' }).click();
  await page.getByRole('button', { name: /^Write \d+ letters?$/ }).click();
  await page.waitForURL(/letters\/[0-9a-f-]{36}$/);
  await page.getByText('Somebody else checks these letters.').waitFor();
  return new URL(page.url()).pathname;
}

/** Checks a batch that somebody else prepared, and sends it. */
export async function checkAndSend({ page, open }: Visitor, batch: string): Promise<void> {
  await open(batch);
  await page.getByRole('button', { name: 'They are right' }).click();
  await page.getByRole('button', { name: /^Send \d+ letters?…$/ }).click();
  await page.getByRole('button', { name: 'Send them' }).click();
  await page.getByText(/^\d+ sent by e-mail/).waitFor();
}
