import { expect } from 'vitest';
import { axeFaults } from '../drivers/axe.ts';
import { downloadedPdf, sheetOnScreen } from '../drivers/evidence.ts';
import { journey } from '../drivers/journey.ts';
import { mapIsStill } from '../drivers/plan.ts';
import { runOf } from '../drivers/runs.ts';
import { addressOf } from '../drivers/schemes.ts';
import { signInAs } from '../drivers/sign-in.ts';

journey('a witness lays out a sheet, keeps the layout, and prints it', async ({ visit }) => {
  const name = `The market, ${crypto.randomUUID().slice(0, 6)}`;
  const visitor = await visit();
  const { page, open } = visitor;
  await signInAs(visitor, 'designer');
  const scheme = await addressOf(visitor);
  await runOf(visitor, scheme, 'A, Market Place');

  const witness = await visit();
  await signInAs(witness, 'witness');
  await witness.open(`${scheme}/evidence`);
  const sheet = await sheetOnScreen(witness);
  await sheet.getByText('Buildings by damage category').waitFor();
  await witness.page.getByLabel('Scale 1 :').fill('500');
  await sheet.getByText('Scale 1 : 500 on A3').waitFor();
  expect(await axeFaults(witness.page)).toEqual([]);
  await witness.page.getByLabel('Name of the layout').fill(name);
  await witness.page.getByRole('button', { name: 'Keep as a new layout' }).click();
  await witness.page.getByLabel('Named layout').getByText(name).waitFor({ state: 'attached' });
  await witness.page.getByRole('button', { name: 'Print', exact: true }).click();
  const print = witness.page.getByRole('list', { name: 'Prints' }).getByRole('listitem');
  const file = await downloadedPdf(print.filter({ hasText: name }), witness);
  expect(file.start).toBe('%PDF');
  expect(file.name).toMatch(/\.pdf$/);

  // what the Plan shows takes two clicks
  await open(`${scheme}/plan`);
  await mapIsStill(visitor);
  await page.getByRole('button', { name: 'Print', exact: true }).click();
  const dialog = page.getByRole('dialog', { name: 'Print what the Plan shows' });
  expect(await axeFaults(page)).toEqual([]);
  await dialog.getByRole('button', { name: 'Print', exact: true }).click();
  expect((await downloadedPdf(dialog, visitor)).start).toBe('%PDF');
});
