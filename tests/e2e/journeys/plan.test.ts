import { describe, expect } from 'vitest';
import { axeFaults } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { tabTo } from '../drivers/keyboard.ts';
import {
  factOf,
  isSelected,
  mapIsStill,
  mapOf,
  middleOf,
  openPlan,
  search,
  selectedName,
} from '../drivers/plan.ts';
import { signInAs } from '../drivers/sign-in.ts';
import { DESK, PHONE } from '../drivers/visitor.ts';

describe('the plan', () => {
  journey('finds a building by name, goes there, and lets it be pressed', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'assessor');
    await openPlan(visitor);
    expect(await selectedName(visitor)).toBe('Nothing selected');

    const found = await search(visitor, 'customs');
    expect(found).toEqual([expect.stringContaining('Customs House')]);
    await visitor.page.keyboard.press('Enter');
    await isSelected(visitor, 'Customs House');
    expect(await factOf(visitor, 'Eaves above ground')).toMatch(/^Eaves above ground\d+\.\dm$/);
    expect(await factOf(visitor, 'Founding depth')).toBe('Founding depthnot known');
    const marked = await middleOf(visitor);

    await visitor.page.keyboard.press('Escape');
    await isSelected(visitor, 'Nothing selected');
    expect(await middleOf(visitor)).not.toBe(marked);

    await mapOf(visitor).click();
    await isSelected(visitor, 'Customs House');
    expect(visitor.page.url()).toMatch(/\?building=\d+$/);
  });

  journey('says where the cursor is, in the grid of the scheme', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'designer');
    await openPlan(visitor);
    await visitor.page.getByText('Middle').waitFor();
    await mapOf(visitor).hover();
    await visitor.page.getByText(/^E 412\u2009\d{3}\.\d$/).waitFor();
    await visitor.page.getByText(/^N 6\u2009068\u2009\d{3}\.\d$/).waitFor();
  });

  journey('opens at the building of its address', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'witness');
    await openPlan(visitor);
    await search(visitor, 'elwin');
    await visitor.page.keyboard.press('Enter');
    await isSelected(visitor, 'Church of St Elwin');
    await visitor.page.reload();
    await isSelected(visitor, 'Church of St Elwin');
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

  journey('has nothing to find by words that no building has', async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'assessor');
    await openPlan(visitor);
    await visitor.page.getByRole('combobox').fill('no such street');
    await visitor.page.getByText('No building has this reference, name or address.').waitFor();
  });

  journey('says so when some of the map does not come, and fetches it again', async ({ visit }) => {
    const visitor = await visit();
    const { page } = visitor;
    await signInAs(visitor, 'assessor');
    await page.route('**/tiles/buildings/**', (route) => route.abort());
    await openPlan(visitor);
    await page.getByText('Some of the map did not come.').waitFor();
    await page.unroute('**/tiles/buildings/**');
    await page.getByRole('button', { name: 'Fetch it again' }).click();
    await page.getByText('Some of the map did not come.').waitFor({ state: 'detached' });
    await mapIsStill(visitor);
    while (visitor.faults.length > 0) visitor.expectFault(/ERR_FAILED/);
  });
});

describe('the map library', () => {
  journey('is fetched for the plan and for no other page', async ({ visit }) => {
    const visitor = await visit();
    const scripts: string[] = [];
    visitor.page.on('request', (request) => scripts.push(new URL(request.url()).pathname));
    await signInAs(visitor, 'assessor');
    await visitor.page.waitForLoadState('networkidle');
    expect(scripts.filter((path) => path.includes('plan-map'))).toEqual([]);
    await openPlan(visitor);
    expect(scripts.filter((path) => path.includes('plan-map'))).not.toEqual([]);
  });
});

describe.each([
  ['a desk', DESK],
  ['a phone', PHONE],
])('at %s', (_name, size) => {
  journey('axe finds nothing against the plan', async ({ visit }) => {
    const visitor = await visit(size);
    await signInAs(visitor, 'assessor');
    await openPlan(visitor);
    expect(await axeFaults(visitor.page)).toEqual([]);
    await search(visitor, 'the');
    expect(await axeFaults(visitor.page)).toEqual([]);
    await visitor.page.keyboard.press('Enter');
    await visitor.page.getByText('Use').waitFor();
    expect(await axeFaults(visitor.page)).toEqual([]);
  });
});

journey('a scheme without buildings says what to do first', async ({ visit }) => {
  const visitor = await visit();
  const { page, open } = visitor;
  await signInAs(visitor, 'administrator');
  await open('/schemes/new');
  await page.getByLabel('Name').fill('Empty crossing');
  await page.getByRole('combobox').fill('25832');
  await page.getByRole('option').first().click();
  await page.getByRole('button', { name: 'Make the scheme' }).click();
  await page.getByText('No buildings yet.').waitFor();
  await mapIsStill(visitor);
  expect(await axeFaults(page)).toEqual([]);
  await page.getByRole('link', { name: 'Bring in streets and water' }).click();
  await page.waitForURL(/\/settings\/background$/);
});
