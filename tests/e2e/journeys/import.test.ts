import { describe, expect } from 'vitest';
import { laterTown, quirkyTown } from '../../support/quirky-town.ts';
import { axeFaults, axeFaultsAtBothSizes, axeFaultsOn } from '../drivers/axe.ts';
import {
  bringIn,
  changeByHand,
  checkAgain,
  countOf,
  isChecked,
  makeScheme,
  openLine,
  sendFile,
} from '../drivers/imports.ts';
import { journey } from '../drivers/journey.ts';
import { mapIsStill } from '../drivers/plan.ts';
import { signInAs } from '../drivers/sign-in.ts';
import { DESK, PHONE, type Visitor } from '../drivers/visitor.ts';

/** A scheme of its own, with the assessor at its page of imports. */
async function begin(visit: () => Promise<Visitor>, name: string) {
  const administrator = await visit();
  await signInAs(administrator, 'administrator');
  const scheme = await makeScheme(administrator, name);
  const assessor = await visit();
  await signInAs(assessor, 'assessor');
  return { scheme, assessor };
}

describe('an import', () => {
  journey('is looked at, mapped, mended and brought in, and comes again', async ({ visit }) => {
    const { scheme, assessor } = await begin(visit, 'First import');
    const { page } = assessor;
    await sendFile(assessor, scheme, 'town.geojson', quirkyTown());
    expect(await countOf(assessor, 'refused')).toBe('3');
    await page.getByText('EPSG:4326 WGS 84').waitFor();

    await page.getByLabel('Name', { exact: true }).selectOption('house');
    await page.getByLabel('Reference', { exact: true }).selectOption('ref');
    await page.getByLabel('Storeys', { exact: true }).selectOption('floors');
    await page.getByLabel(/^Eaves above ground/).selectOption('eaves');
    if (await page.getByRole('button', { name: 'Check again' }).isVisible()) {
      await checkAgain(assessor);
    }
    await page.getByRole('button', { name: 'refused' }).click();
    await openLine(assessor, 'Q-5');
    await page.getByRole('img', { name: 'Mended' }).waitFor();
    await page.getByLabel('Mend crossing outlines').check();
    await isChecked(assessor);
    await page.getByRole('button', { name: /^2\s*refused$/ }).waitFor();
    expect(await countOf(assessor, 'new')).toBe('8');
    await mapIsStill(assessor);
    expect(await axeFaults(page)).toEqual([]);

    await page.reload();
    await isChecked(assessor);
    expect(await bringIn(assessor)).toBe('Brought in: 8 new.');
    await page.getByRole('link', { name: 'See them on the plan' }).click();
    await page.getByRole('combobox', { name: 'Find a building' }).fill('House 5');
    await page.getByRole('option', { name: /Q-5/ }).waitFor();

    // it comes again with what has changed, and asks where both did
    await changeByHand(assessor, scheme, 'Q-3', { storeys: 3 });
    const later = laterTown({
      'Q-2': { floors: '4' },
      'Q-3': { floors: '5' },
      'Q-10': { floors: '1' },
      'Q-11': { floors: '6' },
    });
    await sendFile(assessor, scheme, 'town-later.geojson', later);
    await page.getByText(/^As chosen on /).waitFor();
    expect(await countOf(assessor, 'changed')).toBe('3');
    expect(await countOf(assessor, 'to settle')).toBe('1');
    await page.getByText('Settle the building that changed here and in the file.').waitFor();

    await page.getByRole('button', { name: 'to settle' }).click();
    await openLine(assessor, 'Q-3');
    await page.getByRole('table', { name: 'Values of Q-3' }).getByText('both changed').waitFor();
    expect(await axeFaults(page)).toEqual([]);
    const ways = page.getByRole('group', { name: 'Where both changed, for Q-3' });
    await ways.getByRole('button', { name: 'Take theirs' }).click();
    await checkAgain(assessor);
    expect(await bringIn(assessor)).toBe('Brought in: 4 changed.');

    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await page.getByRole('button', { name: 'Undo it' }).click();
    await page.getByText('Undone. The register is as it was before.').waitFor();
  });

  journey('can be given up, and a file that is none is refused', async ({ visit }) => {
    const { scheme, assessor } = await begin(visit, 'No import');
    const { page, open } = assessor;
    await sendFile(assessor, scheme, 'town.geojson', quirkyTown());
    await mapIsStill(assessor);
    expect(await axeFaultsAtBothSizes(page)).toEqual([]);
    for (const size of [PHONE, DESK]) {
      await page.setViewportSize(size);
      const widths = await page.evaluate(() => [
        document.getElementById('content')?.scrollWidth,
        document.getElementById('content')?.clientWidth,
      ]);
      expect(widths[0]).toBe(widths[1]);
    }
    await page.getByRole('button', { name: 'Cancel import' }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Cancel import' }).click();
    await page.getByText('Cancelled. The register is as it was.').waitFor();

    await open(`${scheme}/register/imports`);
    await page.waitForLoadState('networkidle');
    expect(await axeFaultsAtBothSizes(page)).toEqual([]);
    const file = { name: 'a.geojson', mimeType: 'text/plain', buffer: Buffer.from('{"type":') };
    const chooser = page.waitForEvent('filechooser');
    await page.getByRole('button', { name: 'Choose a file of buildings' }).click();
    await (await chooser).setFiles(file);
    await page.getByRole('alert').getByText('This file was not brought in.').waitFor();
    await page.getByRole('link', { name: 'Bring in a file' }).click();
    await page.getByRole('link', { name: 'town.geojson' }).waitFor();

    expect(await axeFaultsOn(assessor, [`${scheme}/settings/ground`])).toEqual([]);
  });
});
