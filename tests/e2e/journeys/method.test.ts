import { describe, expect } from 'vitest';
import { axeFaults, axeFaultsAtBothSizes } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { signInAs } from '../drivers/sign-in.ts';

describe('the method', () => {
  journey('is open to an owner, and its checks agree in this browser', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'owner');
    const { page } = visitor;
    await page.getByRole('link', { name: 'How we work it out' }).click();
    await page.getByRole('heading', { name: 'Method', level: 1 }).waitFor();
    await page
      .getByText(/^(\d+) of \1 agree$/)
      .first()
      .waitFor();
    expect(await page.getByText('differs').count()).toBe(0);
    expect(await page.locator('math').count()).toBeGreaterThan(50);
    expect(await axeFaultsAtBothSizes(page)).toEqual([]);
    await page.getByRole('button', { name: 'Run again' }).click();
    await page
      .getByText(/^(\d+) of \1 agree$/)
      .first()
      .waitFor();
  });
});

journey('lets one wall be tried out, in an address to be sent on', async ({ visit }) => {
  const visitor = await visit();
  await signInAs(visitor, 'witness');
  const { page } = visitor;
  await visitor.open('/method');
  await page.getByRole('link', { name: 'What-if on one wall' }).click();
  await page.getByText('strain 0.0379').waitFor();
  const losses = page.getByRole('group', { name: 'Volume loss' });
  await losses.getByLabel('High').fill('7');
  await losses.getByLabel('Central').fill('6');
  await page
    .getByText(/^Moderate/i)
    .first()
    .waitFor();
  await page.getByText('Breaks at 4.40 %: not above the central value.').waitFor();
  expect(await axeFaultsAtBothSizes(page)).toEqual([]);

  await visitor.open(page.url());
  expect(await losses.getByLabel('Central').inputValue()).toBe('6');
  await page.getByRole('button', { name: /working of the strain of zone 2/ }).click();
  const working = page.getByRole('group', { name: /working of the strain of zone 2/ });
  await working.getByText('Copy as text').waitFor();
  expect(await axeFaults(page)).toEqual([]);
  await page.keyboard.press('Escape');
  await working.waitFor({ state: 'detached' });

  await page.getByLabel('Founding depth').fill('18');
  await page.getByText('The wall has to be founded above it.').waitFor();
  await page.getByRole('link', { name: 'Back to the check' }).click();
  await page.getByText('strain 0.0379').waitFor();
  expect(page.url()).toMatch(/\/method\/what-if$/);
});
