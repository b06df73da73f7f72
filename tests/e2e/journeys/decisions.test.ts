import { expect } from 'vitest';
import { axeFaults, axeFaultsAtBothSizes } from '../drivers/axe.ts';
import { decideOnSheet, decisionOf, funnelOf, markAllFound } from '../drivers/decisions.ts';
import { journey } from '../drivers/journey.ts';
import { countIs, openRegister } from '../drivers/register.ts';
import { runOf } from '../drivers/runs.ts';
import { addressOf } from '../drivers/schemes.ts';
import { mapOfRun } from '../drivers/sheets.ts';
import { signInAs } from '../drivers/sign-in.ts';

const OPTION = 'A, Market Place';

journey('a town is let go at stage 1 by one assessor and checked by another', async ({ visit }) => {
  const first = await visit();
  await signInAs(first, 'assessor');
  await runOf(first, await addressOf(first), OPTION);
  await openRegister(first);
  await funnelOf(first)
    .getByRole('link', { name: /Stage 1, screening/ })
    .click();
  const count = await markAllFound(first);
  await first.page.getByRole('button', { name: 'Decide…' }).click();
  await first.page.getByRole('button', { name: 'Look at it first' }).click();
  const prepare = first.page.getByRole('button', { name: /^Prepare [1-9][\d\s]* for check$/ });
  await prepare.waitFor();
  expect(await axeFaults(first.page)).toEqual([]);
  await prepare.click();
  await first.page
    .getByText(/prepared: let go at stage 1\. Somebody else checks them\.$/)
    .waitFor();

  const second = await visit();
  await signInAs(second, 'second-assessor');
  await second.page.getByText('decisions to check', { exact: true }).waitFor();
  await second.page.getByRole('link', { name: 'Check them' }).click();
  await countIs(second, /^[\d\s]+ of [\d\s]+ buildings$/);
  expect(await markAllFound(second)).toBe(count);
  await second.page.getByRole('button', { name: 'Check…' }).click();
  const check = second.page.getByRole('button', { name: /^Check [1-9][\d\s]*$/ });
  await check.waitFor();
  expect(await axeFaults(second.page)).toEqual([]);
  await check.click();
  await second.page.getByText(/^[\d\s]+ checked\.$/).waitFor();
  await funnelOf(second)
    .getByRole('link', { name: /^[\d\s]+ decided$/ })
    .waitFor();
});

journey('one building is decided, returned, decided again and superseded', async ({ visit }) => {
  const first = await visit();
  await signInAs(first, 'assessor');
  const scheme = await addressOf(first);
  const run = await runOf(first, scheme, OPTION);
  const map = await mapOfRun(first, `${scheme}/runs/${run.id}`);
  const id = map.ids[map.stage.indexOf(3)] ?? 0;
  const sheet = `${scheme}/buildings/${id}/sheet`;
  await first.open(sheet);
  await first.page.getByText(/the same figures as recorded/).waitFor();
  await decideOnSheet(first, { kind: 'No measures', reason: 'Looked at from the street.' });
  await decisionOf(first).getByText('You prepared this, so someone else checks it.').waitFor();
  expect(await axeFaultsAtBothSizes(first.page)).toEqual([]);

  const second = await visit();
  await signInAs(second, 'second-assessor');
  await second.open(sheet);
  await decisionOf(second).getByText('Looked at from the street.').waitFor();
  await decisionOf(second).getByText('What it rests on, as it was prepared').click();
  await decisionOf(second).getByRole('button', { name: 'Return' }).click();
  await decisionOf(second).getByText('Say why it is returned.').waitFor();
  await decisionOf(second).getByRole('textbox', { name: 'Comment' }).fill('Go inside first.');
  expect(await axeFaultsAtBothSizes(second.page)).toEqual([]);
  await decisionOf(second).getByRole('button', { name: 'Return' }).click();
  await decisionOf(second).getByText('“Go inside first.”').waitFor();

  await first.page.reload();
  await decisionOf(first).getByText('Returned', { exact: true }).waitFor();
  await decideOnSheet(first, { kind: 'Protective measures', reason: 'The vault is open.' });
  await second.page.reload();
  await decisionOf(second).getByRole('button', { name: 'Check', exact: true }).click();
  await decisionOf(second).getByText('Checked', { exact: true }).nth(1).waitFor();

  await decideOnSheet(second, { kind: 'No measures', reason: 'The vault was propped before.' });
  await first.page.reload();
  await decisionOf(first).getByRole('button', { name: 'Check', exact: true }).click();
  await first.page.getByText('2 earlier').click();
  await first.page.getByText('Superseded', { exact: true }).waitFor();
  expect(await axeFaultsAtBothSizes(first.page)).toEqual([]);
});
