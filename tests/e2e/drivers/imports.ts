import { randomBytes } from 'node:crypto';
import { registerPageSchema } from '../../../shared/schemas/register.ts';
import { answered, sent } from './api.ts';
import type { Visitor } from './visitor.ts';

/** The server reads and checks a file beside what else it does. */
const PATIENCE_MS = 60_000;

/**
 * Makes a scheme in UTM zone 31 and lets the assessor work in it; gives its address. No two schemes have one
 * name, so a second go has one of its own.
 */
export async function makeScheme({ page, open }: Visitor, name: string): Promise<string> {
  await open('/schemes/new');
  await page.getByLabel('Name').fill(`${name} ${randomBytes(4).toString('hex')}`);
  await page.getByRole('combobox').fill('32631');
  await page.getByRole('option').first().click();
  await page.getByRole('button', { name: 'Make the scheme' }).click();
  await page.waitForURL(/\/schemes\/[0-9a-f-]{36}/);
  const scheme = /\/schemes\/[0-9a-f-]{36}/.exec(page.url())?.[0] ?? '';
  await open(`${scheme}/settings/people`);
  const person = page.getByLabel('Person', { exact: true });
  const option = person.getByRole('option', { name: /^Assessor, / });
  await person.selectOption((await option.getAttribute('value')) ?? '');
  await page.getByLabel('Role', { exact: true }).selectOption('assessor');
  await page.getByRole('button', { name: /^Add/ }).click();
  await page
    .getByRole('cell', { name: /Assessor/ })
    .first()
    .waitFor();
  return scheme;
}

/** Chooses a file on the page of imports and waits for its preview. */
export async function sendFile(
  { page, open }: Visitor,
  scheme: string,
  name: string,
  content: unknown,
): Promise<void> {
  await open(`${scheme}/register/imports`);
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Choose a file of buildings' }).click();
  const buffer = Buffer.from(JSON.stringify(content));
  await (await chooser).setFiles({ name, mimeType: 'application/geo+json', buffer });
  await isChecked({ page });
}

/** Waits until the file has been checked by what is chosen. */
export async function isChecked({ page }: Pick<Visitor, 'page'>): Promise<void> {
  await page.getByRole('heading', { name: 'What will happen' }).waitFor({ timeout: PATIENCE_MS });
  await page.getByRole('button', { name: /^(Bring in|Change) / }).waitFor({ timeout: PATIENCE_MS });
}

/** How many rows come to something, by the word under the figure. */
export async function countOf({ page }: Visitor, word: string): Promise<string> {
  const counts = page.getByRole('group', { name: 'Show rows that are' });
  const text = await counts.getByRole('button', { name: word }).textContent();
  return (text ?? '').replace(word, '').trim();
}

/** Checks again by what was chosen, and waits for it. */
export async function checkAgain(visitor: Visitor): Promise<void> {
  await visitor.page.getByRole('button', { name: 'Check again' }).click();
  await isChecked(visitor);
}

/** Opens a line of the report. */
export async function openLine({ page }: Visitor, reference: string): Promise<void> {
  const report = page.getByRole('table', { name: 'Report by row' });
  await report.getByText(reference, { exact: true }).first().click();
}

/** Brings in what was checked, and gives what the page then says. */
export async function bringIn({ page }: Visitor): Promise<string> {
  await page.getByRole('button', { name: /^Bring in / }).click();
  const said = page.getByText(/^Brought in: /);
  await said.waitFor({ timeout: PATIENCE_MS });
  return (await said.textContent()) ?? '';
}

/** Changes a building's values as somebody does who works beside. */
export async function changeByHand(
  visitor: Visitor,
  scheme: string,
  reference: string,
  attributes: Readonly<Record<string, string | number>>,
): Promise<void> {
  const filter = encodeURIComponent(JSON.stringify({ search: reference }));
  const found = await answered(visitor, `${scheme}/register?filter=${filter}`);
  const building = registerPageSchema.parse(found).rows.find((row) => row.reference === reference);
  const change = { version: building?.version, attributes };
  await sent(visitor, `${scheme}/buildings/${building?.id ?? 0}`, change, 'PATCH');
}
