import { expect } from 'vitest';
import { axeFaults } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import {
  mapIsStill,
  mapOf,
  middleChanges,
  middleOf,
  openPlan,
  showNoOption,
} from '../drivers/plan.ts';
import { signInAs } from '../drivers/sign-in.ts';
import type { Visitor } from '../drivers/visitor.ts';

const PREVIEW = 'Preview, not a run: central settlement';

/** Presses the map at a share of its width and height. */
async function pressAt(visitor: Visitor, across: number, down: number): Promise<void> {
  const box = await mapOf(visitor).boundingBox();
  if (box === null) throw new Error('The map is not to be seen.');
  const [x, y] = [box.x + box.width * across, box.y + box.height * down];
  await visitor.page.mouse.move(x - 1, y);
  await visitor.page.mouse.click(x, y);
}

async function openOption(visitor: Visitor, name: string): Promise<void> {
  const { page } = visitor;
  await page.getByRole('button', { name: /choose another option$/ }).click();
  await page.getByRole('button', { name, exact: true }).click();
  await page.getByRole('heading', { name, exact: true }).waitFor();
  await page.getByText(PREVIEW).waitFor();
  await mapIsStill(visitor);
}

async function isSaved({ page }: Visitor, name: string): Promise<void> {
  await page.getByRole('button', { name: `${name}, choose another option` }).waitFor();
}

/** Draws a line across the harbour by pointer, gives it a level and saves it. */
async function drawLine(visitor: Visitor): Promise<void> {
  const { page } = visitor;
  await page.getByRole('button', { name: 'Draw another option' }).click();
  await page.getByRole('heading', { name: 'New option' }).waitFor();
  await pressAt(visitor, 0.2, 0.3);
  await page.getByLabel('Point 1, easting').waitFor();
  await pressAt(visitor, 0.5, 0.5);
  await page.getByLabel('Point 2, easting').waitFor();
  await pressAt(visitor, 0.55, 0.8);
  await page.getByLabel('Point 3, easting').waitFor();
  // that one was wrong
  await page.keyboard.press('Control+z');
  await page.getByLabel('Point 3, easting').waitFor({ state: 'detached' });
  await pressAt(visitor, 0.8, 0.5);
  await page.getByLabel('Point 3, easting').waitFor();
  await page.keyboard.press('Enter');
  await page.getByRole('button', { name: 'Draw on from the end' }).waitFor();
  await page.getByLabel('Name').fill('Straight on');
  await page.getByLabel(/^Level 1/).fill('-18');
  await page.getByText(PREVIEW).waitFor();
  expect(await axeFaults(page)).toEqual([]);
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await isSaved(visitor, 'Straight on');
  expect(await axeFaults(page)).toEqual([]);
}

/** Reads the section under the map, sends it along the line and reads it again. */
async function readSection({ page }: Visitor): Promise<void> {
  const strip = page.getByRole('region', { name: 'Section' });
  const figures =
    /scale 1 to \d+, settlement drawn \d+ times\. Largest settlement \d+\.\d mm central/;
  await strip.getByRole('img', { name: figures }).waitFor();
  await strip.getByLabel('at chainage').fill('0+200');
  await page.keyboard.press('Enter');
  await strip.getByRole('img', { name: /^Section across the line at 0\+200,/ }).waitFor();
  await strip.getByRole('heading', { name: 'Section' }).click();
  await page.keyboard.press('.');
  await strip.getByRole('img', { name: /^Section across the line at 0\+205,/ }).waitFor();
  await strip.getByRole('button', { name: 'Along' }).click();
  await strip.getByRole('img', { name: /height drawn \d+ times length\. Largest/ }).waitFor();
  expect(await axeFaults(page)).toEqual([]);
  await strip.getByRole('button', { name: 'Across' }).click();
}

journey('a line is drawn, shows its settlement, and two who change it meet', async ({ visit }) => {
  const designer = await visit();
  const { page } = designer;
  await signInAs(designer, 'designer');
  await openPlan(designer);
  await drawLine(designer);
  await readSection(designer);

  const other = await visit();
  await signInAs(other, 'designer');
  await openPlan(other);
  await openOption(other, 'Straight on');
  const [option] = /option=[^&]+/.exec(other.page.url()) ?? [];
  expect(page.url()).toContain(option);

  await page.keyboard.press('a');
  await page.getByRole('heading', { name: 'Edit Straight on' }).waitFor();
  await other.page.keyboard.press('a');
  await other.page.getByLabel('Diameter, excavated').fill('9');
  await other.page.getByRole('button', { name: 'Save', exact: true }).click();
  await isSaved(other, 'Straight on');

  await page.getByLabel(/^Level 1/).fill('-15');
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await page.getByText(/changed Straight on meanwhile/).waitFor();
  designer.expectFault(/409/);
  await page.getByRole('button', { name: 'See their change' }).click();
  await page.getByRole('row', { name: 'Diameter 6.6 m 9 m' }).waitFor();
  expect(await axeFaults(page)).toEqual([]);
  await page.getByRole('button', { name: 'Keep mine on top of it' }).click();
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await isSaved(designer, 'Straight on');
  await page.getByText('D 9 m, two drives, 15 m apart').waitFor();
  await page.getByText('0 m: −15 m').waitFor();

  // contours of the line come and go with it
  await mapIsStill(designer);
  const seen = await middleOf(designer);
  await showNoOption(designer);
  await middleChanges(designer, seen);

  await openOption(designer, 'Straight on');
  await page.getByRole('button', { name: 'Delete', exact: true }).click();
  await page.getByRole('button', { name: 'Delete it' }).click();
  await page.getByRole('heading', { name: 'A, Market Place' }).waitFor();
});
