import { expect } from 'vitest';
import { visitsSchema } from '../../../shared/schemas/visits.ts';
import { answered } from '../drivers/api.ts';
import { axeFaultsAtBothSizes } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { runOf } from '../drivers/runs.ts';
import { addressOf } from '../drivers/schemes.ts';
import { signInAs } from '../drivers/sign-in.ts';
import { PHONE } from '../drivers/visitor.ts';
import { aPhotograph, fillVisit, smallTargets, takePhotograph } from '../drivers/visits.ts';

const KEPT = '1 kept on this phone, not sent yet.';

journey(
  'a visit without a network is kept, sent once, and stands on the sheet',
  async ({ visit }) => {
    const visitor = await visit(PHONE);
    const { page, open } = visitor;
    await signInAs(visitor, 'assessor');
    const scheme = await addressOf(visitor);
    await runOf(visitor, scheme, 'A, Market Place');
    await open(`${scheme}/visits`);
    const first = page.getByRole('main').getByRole('listitem').first().getByRole('link');
    await first.waitFor();
    expect(await smallTargets(visitor)).toEqual([]);
    expect(await axeFaultsAtBothSizes(page)).toEqual([]);
    await page.setViewportSize(PHONE);
    const address = (await first.getAttribute('href')) ?? '';
    await first.click();
    await page.getByRole('button', { name: 'Record visit' }).waitFor();
    await page
      .getByText(/^In the register/)
      .first()
      .waitFor();

    await page.context().setOffline(true);
    await page.getByRole('button', { name: 'Record visit' }).click();
    await page.getByText('Say whether you were inside or outside.').waitFor();
    await fillVisit(visitor, {
      place: 'Gable',
      width: '0,4',
      notes: 'Stepped crack, painted over.',
    });
    await takePhotograph(visitor, await aPhotograph(visitor), 'The crack');
    expect(await smallTargets(visitor)).toEqual([]);
    expect(await axeFaultsAtBothSizes(page)).toEqual([]);
    await page.setViewportSize(PHONE);
    await page.getByRole('button', { name: 'Record visit' }).click();
    await page.getByText(KEPT).waitFor();

    // the network is back for pages, but nothing can be sent yet
    const visits = '**/api/schemes/*/buildings/*/visits';
    await page.route(visits, (route) =>
      route.request().method() === 'POST' ? route.abort() : route.continue(),
    );
    await page.context().setOffline(false);
    await page.getByText('Not sent: The server cannot be reached.').waitFor();
    await page.reload();
    await page.getByText(KEPT).waitFor();
    await page.getByText('Not sent: The server cannot be reached.').waitFor();
    await page.unroute(visits);
    await page.getByRole('button', { name: 'Send now' }).click();
    await page.getByText('1 visit sent.').waitFor();
    await page.getByText(KEPT).waitFor({ state: 'detached' });
    // once when the network was back, once after the page was loaded again
    visitor.expectFault(/ERR_FAILED/);
    visitor.expectFault(/ERR_FAILED/);

    await open(address.replace(/\/visit$/, '/sheet'));
    await page.getByText('Stepped crack, painted over.').waitFor();
    const picture = page.getByRole('link', { name: 'The crack' }).locator('img');
    await picture.scrollIntoViewIfNeeded();
    await expect
      .poll(() => picture.evaluate((img: HTMLImageElement) => img.naturalWidth))
      .toBe(2400);
    const building = /buildings\/\d+/.exec(address)?.[0] ?? '';
    const recorded = visitsSchema.parse(await answered(visitor, `${scheme}/${building}/visits`));
    expect(recorded).toMatchObject([
      {
        ...{ part: 'outside', condition: 'poor', by: 'Assessor' },
        defects: [{ place: 'Gable', kind: 'crack', width: 0.4 }],
        photographs: [{ hasArrived: true, keepsPlace: false, place: null }],
      },
    ]);
    await open(`${scheme}/visits`);
    await page.getByText(/^Visited .*, outside$/).waitFor();
  },
);
