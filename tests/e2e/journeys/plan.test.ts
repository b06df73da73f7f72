import { randomBytes } from 'node:crypto';
import { describe, expect } from 'vitest';
import { axeFaults, axeFaultsAtBothSizes } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { tabTo } from '../drivers/keyboard.ts';
import {
  factOf,
  isSelected,
  mapIsStill,
  mapOf,
  middleChanges,
  middleOf,
  openPlan,
  search,
  selectedName,
} from '../drivers/plan.ts';
import { signInAs } from '../drivers/sign-in.ts';

describe('the plan', () => {
  journey('finds a building by name, goes there, and lets it be pressed', async ({ visit }) => {
    const visitor = await visit();
    const { page } = visitor;
    await signInAs(visitor, 'assessor');
    await openPlan(visitor);
    expect(await selectedName(visitor)).toBe('Nothing selected');
    expect(await axeFaultsAtBothSizes(page)).toEqual([]);
    await page.getByRole('combobox').fill('no such street');
    await page.getByText('No building has this reference, name or address.').waitFor();

    await search(visitor, 'the');
    expect(await axeFaultsAtBothSizes(page)).toEqual([]);
    const found = await search(visitor, 'customs');
    expect(found).toEqual([expect.stringContaining('Customs House')]);
    await page.keyboard.press('Enter');
    await isSelected(visitor, 'Customs House');
    expect(await factOf(visitor, 'Eaves above ground')).toMatch(/^Eaves above ground\d+\.\dm$/);
    expect(await factOf(visitor, 'Founding level')).toMatch(/\(assumed\)m$/);
    await page.getByRole('table', { name: 'Walls' }).waitFor();
    expect(await axeFaultsAtBothSizes(page)).toEqual([]);
    const marked = await middleOf(visitor);

    await page.keyboard.press('Escape');
    await isSelected(visitor, 'Nothing selected');
    await middleChanges(visitor, marked);

    await mapOf(visitor).click();
    await isSelected(visitor, 'Customs House');
    expect(page.url()).toMatch(/\?building=\d+$/);
    await page.getByText(/^E 412\u2009\d{3}\.\d$/).waitFor();
    await page.getByText(/^N 6\u2009068\u2009\d{3}\.\d$/).waitFor();

    await page.reload();
    await isSelected(visitor, 'Customs House');
  });

  journey('can be gone through without a mouse', async ({ visit }) => {
    const visitor = await visit();
    const { page } = visitor;
    await signInAs(visitor, 'second-assessor');
    await openPlan(visitor);

    await tabTo(page, 'region', 'Map of Port Dogger crossing');
    for (const key of ['ArrowLeft', 'ArrowDown', '+']) await page.keyboard.press(key);
    await mapIsStill(visitor);
    await page.keyboard.press('j');
    const first = await page.waitForURL(/building=\d+/).then(() => page.url());
    // the next one is the next of what is drawn, and the map has moved
    await mapIsStill(visitor);
    await page.keyboard.press('j');
    await page.waitForURL((url) => url.href !== first);
    await page.keyboard.press('k');
    await page.waitForURL(first);

    await tabTo(page, 'combobox', 'Find a building');
    await page.keyboard.type('saltgate');
    await page.getByRole('option').nth(2).waitFor();
    const [, second] = await page.getByRole('option').allTextContents();
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Enter');
    await page.getByText(/^2 of \d+ found for/).waitFor();
    expect(second).toContain(await selectedName(visitor));
    await page.keyboard.press('j');
    await page.getByText(/^3 of \d+ found for/).waitFor();
    await page.keyboard.press('Escape');
    await isSelected(visitor, 'Nothing selected');
  });

  journey('fetches the map late, and again where some of it did not come', async ({ visit }) => {
    const visitor = await visit();
    const { page } = visitor;
    const scripts: string[] = [];
    page.on('request', (request) => scripts.push(new URL(request.url()).pathname));
    await signInAs(visitor, 'assessor');
    await page.waitForLoadState('networkidle');
    // other pages come without the map
    expect(scripts.filter((path) => path.includes('plan-map'))).toEqual([]);

    await page.route('**/tiles/buildings/**', (route) => route.abort());
    await openPlan(visitor);
    expect(scripts.filter((path) => path.includes('plan-map'))).not.toEqual([]);
    await page.getByText('Some of the map did not come.').waitFor();
    await page.unroute('**/tiles/buildings/**');
    const fetched = page.waitForResponse(/\/tiles\/buildings\//);
    await page.getByRole('button', { name: 'Fetch it again' }).click();
    await fetched;
    await page.getByText('Some of the map did not come.').waitFor({ state: 'detached' });
    await mapIsStill(visitor);
    while (visitor.faults.length > 0) visitor.expectFault(/ERR_FAILED/);
  });
});

journey('a scheme without buildings says what to do first', async ({ visit }) => {
  const visitor = await visit();
  const { page, open } = visitor;
  await signInAs(visitor, 'administrator');
  await open('/schemes/new');
  await page.getByLabel('Name').fill(`Empty crossing ${randomBytes(4).toString('hex')}`);
  await page.getByRole('combobox').fill('25832');
  await page.getByRole('option').first().click();
  await page.getByRole('button', { name: 'Make the scheme' }).click();
  await page.getByText('No buildings yet.').waitFor();
  await mapIsStill(visitor);
  expect(await axeFaults(page)).toEqual([]);
  await page.getByRole('link', { name: 'Bring in streets and water' }).click();
  await page.waitForURL(/\/settings\/background$/);
});
