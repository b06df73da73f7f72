import { readFile } from 'node:fs/promises';
import { describe, expect } from 'vitest';
import { axeFaults } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { countIs, filterBy, openedOf, openRegister, press, rowOf } from '../drivers/register.ts';
import { signInAs } from '../drivers/sign-in.ts';
import { PHONE } from '../drivers/visitor.ts';

describe('the register', () => {
  journey('is filtered, ordered, changed and exported', async ({ visit }) => {
    const visitor = await visit();
    const { page } = visitor;
    await signInAs(visitor, 'assessor');
    await openRegister(visitor);
    const all = await countIs(visitor, /^\d.* buildings$/);
    expect(await axeFaults(page)).toEqual([]);

    // filter and order stand in the address, and Back undoes them
    await filterBy(visitor, 'Use', 'place of worship');
    await countIs(visitor, /^3 of /);
    // a column that stands with and without a run
    const building = page.getByRole('columnheader', { name: /^Building/ }).getByRole('button');
    await building.click();
    await page.waitForURL(/sort=address/);
    await building.click();
    await page.waitForURL(/sort=-address/);
    await page.goBack();
    await page.waitForURL(/sort=address/);
    await page.reload();
    await countIs(visitor, /^3 of /);

    // open, edit and undo, by keys
    await press(visitor, 'j', 'Enter');
    const opened = openedOf(visitor);
    const edit = opened.getByRole('button', { name: 'Edit' });
    await edit.waitFor();
    expect(await axeFaults(page)).toEqual([]);
    await edit.focus();
    await press(visitor, 'Enter');
    await opened.getByLabel('Inspected').fill('from the tower');
    await press(visitor, 'Enter');
    await page.getByText(/^B\d+ changed\.$/).waitFor();
    await opened.getByText('from the tower').waitFor();
    await opened.getByRole('button', { name: 'History' }).click();
    await opened.getByRole('cell', { name: 'from the tower' }).waitFor();
    expect(await axeFaults(page)).toEqual([]);
    await opened.getByRole('button', { name: 'Undo' }).first().click();
    await opened.getByText('Undone').waitFor();
    await press(visitor, 'Escape');

    // mark by keys, set for all that are marked, and take it back
    await rowOf(visitor, 'place of worship').first().focus();
    await press(visitor, 'x', 'j', 'x');
    await page.getByText('2 marked').waitFor();
    await page.getByRole('button', { name: 'Set values…' }).click();
    await page.getByRole('checkbox', { name: 'Inspected' }).check();
    await page.getByRole('combobox', { name: 'Inspected' }).fill('inside');
    expect(await axeFaults(page)).toEqual([]);
    await page.getByRole('button', { name: 'Next' }).click();
    await page.getByText(/^Set inspected to inside for 2 buildings; /).waitFor();
    await page.getByRole('button', { name: 'Set for 2' }).click();
    await page.getByText('Inspected set to inside for 2 buildings.').waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByText(/^Undone: /).waitFor();

    // what is seen is what is exported
    await page.getByRole('button', { name: 'Export' }).click();
    const download = page.waitForEvent('download');
    await page.getByRole('link', { name: /^CSV/ }).click();
    const file = await readFile(await (await download).path(), 'utf8');
    expect(file.trim().split('\n')).toHaveLength(4);

    await page.getByRole('button', { name: 'Clear', exact: true }).click();
    await countIs(visitor, new RegExp(`^${all}$`));
  });

  journey('is searched, and keeps its place with the map', async ({ visit }) => {
    const visitor = await visit();
    const { page } = visitor;
    await signInAs(visitor, 'second-assessor');
    await openRegister(visitor);
    await press(visitor, '/');
    await page.keyboard.type('customs');
    await countIs(visitor, /^1 of /);
    await press(visitor, 'Escape', 'Escape');
    await countIs(visitor, /^\d.* buildings$/);
    await press(visitor, 'j', 'j', 'p');
    await page.getByRole('region', { name: /^Map of / }).waitFor();
    await page.getByRole('button', { name: 'Hide the map' }).click();
    await page.reload();
    await page.getByRole('button', { name: 'Show the map' }).waitFor();
  });

  journey('is read on a phone', async ({ visit }) => {
    const visitor = await visit(PHONE);
    const { page } = visitor;
    await signInAs(visitor, 'witness');
    await openRegister(visitor);
    expect(await page.getByRole('checkbox').count()).toBe(0);
    await rowOf(visitor, 'B0002').click();
    await openedOf(visitor).getByRole('button', { name: 'History' }).waitFor();
    expect(await axeFaults(page)).toEqual([]);
  });
});
