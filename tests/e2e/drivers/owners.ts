import type { Visitor } from './visitor.ts';

/** Chooses a table of parties, and waits for the report of what it comes to. */
export async function sendParties(
  { page, open }: Visitor,
  scheme: string,
  lines: readonly string[],
): Promise<void> {
  await open(`${scheme}/owners/parties/imports`);
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Choose a table of parties' }).click();
  const buffer = Buffer.from(lines.join('\n'));
  await (await chooser).setFiles({ name: 'parties.csv', mimeType: 'text/csv', buffer });
  await page.getByRole('button', { name: 'Take over' }).waitFor();
}

/** Writes down what was promised to somebody for a stretch of the line. */
export async function addUndertaking(
  { page, open }: Visitor,
  scheme: string,
  promise: string,
): Promise<void> {
  await open(`${scheme}/owners/undertakings`);
  await page.getByRole('button', { name: 'Add one…' }).click();
  await page.getByLabel('What was promised').fill(promise);
  await page.getByLabel('Or from chainage').fill('100');
  await page.getByLabel('To chainage').fill('250');
  await page.getByLabel('Made to').fill('The harbour board');
  await page.getByLabel('Source').fill('Hearing, day 3');
  await page.getByLabel('Who sees to it').fill('Site office');
  await page.getByRole('button', { name: 'Add it' }).click();
}

/** Says that an undertaking of the list is done, and what shows it. */
export async function closeUndertaking(
  { page }: Visitor,
  promise: string,
  evidence: string,
): Promise<void> {
  await page.getByRole('cell', { name: promise }).click();
  await page.getByRole('button', { name: 'Change or say it is done…' }).click();
  await page.getByLabel('Done on').fill('2026-12-01');
  await page.getByLabel('Evidence').fill(evidence);
  await page.getByRole('button', { name: 'Keep it' }).click();
}

/** Gives owners another telephone number to ask at; gives what the page then says of the version. */
export async function changeTelephone(
  { page, open }: Visitor,
  scheme: string,
  number: string,
): Promise<void> {
  await open(`${scheme}/owners/letters/settings`);
  await page.getByRole('button', { name: 'Change this' }).click();
  await page.getByLabel('Telephone').fill(number);
  await page.getByRole('button', { name: /^Keep as version \d+$/ }).click();
}
