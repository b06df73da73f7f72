import { expect } from 'vitest';
import { figuresOfCase, figuresOfSheet } from '../../support/figures-of-case.ts';
import { axeFaults } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { runOf } from '../drivers/runs.ts';
import { addressOf } from '../drivers/schemes.ts';
import { buildingOfRun, caseOfRun, mapOfRun, sheetIs, unlikeBuildings } from '../drivers/sheets.ts';
import { signInAs } from '../drivers/sign-in.ts';
import { DESK, PHONE } from '../drivers/visitor.ts';

const OPTION = 'A, Market Place';

journey('a sheet is opened from the plan and read, and the next one follows', async ({ visit }) => {
  const visitor = await visit();
  const { page, open } = visitor;
  await signInAs(visitor, 'assessor');
  const scheme = await addressOf(visitor);
  const { id: runId } = await runOf(visitor, scheme, OPTION);
  const run = `${scheme}/runs/${runId}`;
  const map = await mapOfRun(visitor, run);
  const worst = map.ids[map.central.indexOf(Math.max(...map.central))] ?? 0;
  const building = await buildingOfRun(visitor, run, worst);
  const { reference } = building.facts;

  await open(`${scheme}/plan?building=${worst}`);
  await page.getByRole('region', { name: /^What run \d+ found$/ }).waitFor();
  await page.getByRole('link', { name: 'Open sheet' }).click();
  await sheetIs(visitor, reference);
  const figure = page.getByRole('button', { name: /working of the strain of zone/ }).last();
  await figure.click();
  const working = page.getByRole('group', { name: /working of the strain of zone/ });
  await working.getByText('Copy as text').waitFor();
  expect(await axeFaults(page)).toEqual([]);
  await page.keyboard.press('Escape');
  await working.waitFor({ state: 'detached' });
  await page.setViewportSize(PHONE);
  expect(await axeFaults(page)).toEqual([]);
  await page.setViewportSize(DESK);

  const next = await buildingOfRun(visitor, run, building.next ?? 0);
  await page.keyboard.press(']');
  await sheetIs(visitor, next.facts.reference);
  await page.keyboard.press('[');
  await sheetIs(visitor, reference);

  await page.getByRole('link', { name: 'Try other values on this wall' }).click();
  await page.getByRole('heading', { name: 'What-if on one wall' }).waitFor();
  await page.getByText('The line has two drives. Only the nearer one is here.').waitFor();
  const strain = page.getByRole('status').filter({ hasText: 'at the central values, strain' });
  await strain.waitFor();
  expect(await axeFaults(page)).toEqual([]);
});

journey('twenty sheets show what assess makes of their cases', async ({ visit }) => {
  const visitor = await visit();
  await signInAs(visitor, 'assessor');
  const scheme = await addressOf(visitor);
  const detail = await runOf(visitor, scheme, OPTION);
  const run = `${scheme}/runs/${detail.id}`;
  const chosen = unlikeBuildings(await mapOfRun(visitor, run), 20);
  expect(chosen).toHaveLength(20);
  const [stages, categories] = [new Set<number>(), new Set<number | null>()];
  for (const id of chosen) {
    const building = await buildingOfRun(visitor, run, id);
    const { reference } = building.facts;
    const { record, ...shown } = figuresOfSheet(detail, building);
    const figures = figuresOfCase(await caseOfRun(visitor, run, id));
    expect([reference, shown]).toStrictEqual([reference, figures]);
    expect([reference, record]).toStrictEqual([reference, building.result]);
    stages.add(building.result.stage);
    categories.add(building.result.category);
  }
  expect([...stages].sort()).toEqual([1, 2, 3]);
  expect(categories.size).toBeGreaterThan(3);
});
