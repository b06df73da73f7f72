import { expect } from 'vitest';
import { axeFaults } from '../drivers/axe.ts';
import { buildingShown, pressGround } from '../drivers/ground.ts';
import { journey } from '../drivers/journey.ts';
import { isSelected, mapIsStill, openPlan, search, showNoOption } from '../drivers/plan.ts';
import { signInAs } from '../drivers/sign-in.ts';
import type { Visitor } from '../drivers/visitor.ts';

type Place = readonly [number, number];

function beside([east, north]: Place, by: Place): Place {
  return [east + by[0], north + by[1]];
}

async function isTold({ page }: Visitor, words: RegExp): Promise<void> {
  await page.getByRole('complementary').getByText(words).waitFor();
}

async function setCorner({ page }: Visitor, what: string, [east, north]: Place): Promise<void> {
  const form = page.getByRole('form', { name: `Add a ${what}` });
  await form.getByLabel('Easting').fill(String(east));
  await form.getByLabel('Northing').fill(String(north));
  await page.keyboard.press('Enter');
}

/** Draws a building against the west wall of the Customs House and saves it. */
async function drawNextDoor(visitor: Visitor): Promise<readonly Place[]> {
  const { page } = visitor;
  const house = await buildingShown(visitor);
  const ring = house.footprint[0]?.[0] ?? [];
  const [south = [0, 0], north = [0, 0]] = [ring[0], ring.at(-2)];
  await page.keyboard.press('Escape');
  await page.keyboard.press('d');
  await page.getByRole('heading', { name: 'Draw a building' }).waitFor();
  await pressGround(visitor, house, beside(south, [-0.7, -0.5]));
  await page.getByLabel('Corner 1, easting').waitFor();
  await pressGround(visitor, house, beside(south, [-9, -3]));
  await pressGround(visitor, house, beside(north, [-12, 9]));
  await page.getByLabel('Corner 3, easting').waitFor();
  // that one was wrong
  await page.keyboard.press('Control+z');
  await page.getByLabel('Corner 3, easting').waitFor({ state: 'detached' });
  await pressGround(visitor, house, beside(north, [-9, -3]));
  await pressGround(visitor, house, beside(north, [-0.7, 0.5]));
  await page.getByLabel('Corner 4, easting').waitFor();
  expect(await axeFaults(page)).toEqual([]);
  await page.keyboard.press('Enter');
  await page.getByLabel('Reference').waitFor();
  expect(await axeFaults(page)).toEqual([]);
  return [south, north];
}

journey('a building is drawn, changed, split, joined and removed', async ({ visit }) => {
  const visitor = await visit();
  const { page } = visitor;
  await signInAs(visitor, 'assessor');
  await openPlan(visitor);
  // a run that another journey left knows nothing of a building that is drawn after it
  await showNoOption(visitor);
  await search(visitor, 'customs');
  await page.keyboard.press('Enter');
  await isSelected(visitor, 'Customs House');

  const shared = await drawNextDoor(visitor);
  await page.getByLabel('Reference').fill('Annexe');
  await page.getByRole('button', { name: 'Save the building' }).click();
  await isTold(visitor, /^Annexe is in the register\.$/);
  await isSelected(visitor, 'Annexe');
  const drawn = await buildingShown(visitor);
  expect(drawn.footprint[0]?.[0]).toEqual(expect.arrayContaining([...shared]));

  await page.keyboard.press('e');
  const easting = page.getByLabel('Corner 2, easting');
  const before = await easting.inputValue();
  await easting.fill(String(Number(before) - 1));
  await page.keyboard.press('Enter');
  expect(await axeFaults(page)).toEqual([]);
  await page.getByRole('button', { name: 'Save the outline' }).click();
  await isTold(visitor, /^The outline of Annexe is changed\.$/);
  await page.getByRole('heading', { name: 'Annexe' }).click();
  await page.keyboard.press('Control+z');
  await isTold(visitor, /^Undone: The outline of Annexe is changed\.$/);
  await isSelected(visitor, 'Annexe');
  expect((await buildingShown(visitor)).footprint).toEqual(drawn.footprint);

  const corner: Place = drawn.footprint[0]?.[0]?.[0] ?? [0, 0];
  await page.keyboard.press('c');
  await setCorner(visitor, 'point', beside(corner, [-30, 4]));
  await setCorner(visitor, 'point', beside(corner, [30, 18]));
  await page.getByText('A new building gets').waitFor();
  expect(await axeFaults(page)).toEqual([]);
  await page.getByRole('button', { name: 'Split it' }).click();
  await isTold(visitor, /^Annexe is split\.$/);
  await isSelected(visitor, 'Annexe');

  await page.keyboard.press('u');
  await search(visitor, 'Annexe-2');
  await page.keyboard.press('Enter');
  await page.getByText('Together').waitFor();
  expect(await axeFaults(page)).toEqual([]);
  await page.getByRole('button', { name: 'Join them' }).click();
  await isTold(visitor, /^Annexe-2 joined to Annexe\.$/);
  await isSelected(visitor, 'Annexe');

  await page.keyboard.press('Delete');
  await page.getByRole('button', { name: 'Remove it' }).click();
  await isTold(visitor, /^Annexe is removed\.$/);
  await isSelected(visitor, 'Nothing selected');
  await page.getByRole('button', { name: 'Undo Ctrl Z' }).click();
  await isTold(visitor, /^Undone: Annexe is removed\.$/);
  await isSelected(visitor, 'Annexe');
  await mapIsStill(visitor);
});
