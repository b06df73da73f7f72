import { expect } from 'vitest';
import { axeFaults } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { isSelected, mapIsStill, middleOf, openPlan, search } from '../drivers/plan.ts';
import { countsOfShownRun, legendCounts, runOption, showEnd } from '../drivers/runs.ts';
import { signInAs } from '../drivers/sign-in.ts';

journey('an option is run, and the map shows what it does to the buildings', async ({ visit }) => {
  const visitor = await visit();
  const { page } = visitor;
  await signInAs(visitor, 'designer');
  const scheme = await openPlan(visitor);
  await page.getByRole('button', { name: /choose another option$/ }).click();
  await page.getByRole('button', { name: 'A, Market Place', exact: true }).click();
  await runOption(visitor);
  expect(await axeFaults(page)).toEqual([]);

  const counts = await countsOfShownRun(visitor, scheme);
  const [letGo] = counts.stages;
  expect(await legendCounts(visitor)).toEqual([...counts.central, letGo]);
  await showEnd(visitor, 'Low');
  expect(await legendCounts(visitor)).toEqual([...counts.low, letGo]);
  await page.keyboard.press('3');
  await page.getByText('Categories at the high end, contours central').waitFor();
  expect(await legendCounts(visitor)).toEqual([...counts.high, letGo]);

  // what is under the line looks otherwise at the other end
  await search(visitor, 'customs');
  await page.keyboard.press('Enter');
  await isSelected(visitor, 'Customs House');
  await page.getByRole('region', { name: /^What run \d+ found$/ }).waitFor();
  await mapIsStill(visitor);
  const seen = await middleOf(visitor);
  await page.getByRole('button', { name: 'Nothing', exact: true }).click();
  await mapIsStill(visitor);
  expect(await middleOf(visitor)).not.toBe(seen);
  await page.getByRole('button', { name: 'Category', exact: true }).click();

  await page.reload();
  await mapIsStill(visitor);
  await page.getByText('Categories at the high end, contours central').waitFor();
  expect(await legendCounts(visitor)).toEqual([...counts.high, letGo]);
  expect(await axeFaults(page)).toEqual([]);

  await page.getByRole('button', { name: /^What run \d+ rests on$/ }).click();
  await page.getByRole('table', { name: 'Buildings by category' }).waitFor();
  expect(await axeFaults(page)).toEqual([]);
});
