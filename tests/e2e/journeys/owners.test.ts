import { expect } from 'vitest';
import { z } from 'zod';
import { answered, sent } from '../drivers/api.ts';
import { axeFaultsAtBothSizes } from '../drivers/axe.ts';
import { journey } from '../drivers/journey.ts';
import { checkAndSend, prepareLetters } from '../drivers/letters.ts';
import { readLetterTo } from '../drivers/mailbox.ts';
import { runOf } from '../drivers/runs.ts';
import { addressOf } from '../drivers/schemes.ts';
import { signInAs } from '../drivers/sign-in.ts';
import { PHONE, type Visitor } from '../drivers/visitor.ts';
import { aPhotograph, smallTargets } from '../drivers/visits.ts';

const OWNER = 'owner@example.org';

const parties = z.object({
  parties: z.array(
    z.object({
      id: z.string(),
      interests: z.array(z.object({ building: z.object({ id: z.number() }) })),
    }),
  ),
});

/** Offers the demo's owner a day for the survey, as the page of appointments does. */
async function offerSurvey(visitor: Visitor, scheme: string): Promise<void> {
  const found = parties.parse(await answered(visitor, `${scheme}/parties?search=${OWNER}`));
  const [party] = found.parties;
  const offered = await sent(visitor, `${scheme}/appointments`, {
    id: crypto.randomUUID(),
    buildingId: party?.interests[0]?.building.id,
    partyId: party?.id,
    purpose: 'condition survey',
    startsAt: new Date(Date.now() + 10 * 24 * 60 * 60 * 1000).toISOString(),
    minutes: 60,
    place: 'At the front door',
    isFreeDayMeant: true,
  });
  expect(offered.status()).toBe(201);
}

journey(
  'a letter is prepared, checked and sent, and its owner reads and answers it',
  async ({ visit }) => {
    // told apart from that of another go
    const title = `Crack ${crypto.randomUUID().slice(0, 6)} over the kitchen door`;
    const assessor = await visit();
    await signInAs(assessor, 'assessor');
    const scheme = await addressOf(assessor);
    await runOf(assessor, scheme, 'A, Market Place');
    const batch = await prepareLetters(assessor, scheme);
    expect(await axeFaultsAtBothSizes(assessor.page)).toEqual([]);
    const second = await visit();
    await signInAs(second, 'second-assessor');
    await checkAndSend(second, batch);
    await offerSurvey(second, scheme);

    const administrator = await visit();
    await signInAs(administrator, 'administrator');
    const { link } = await readLetterTo(administrator, OWNER);
    expect(link).toContain(`${scheme}/home`);

    const owner = await visit(PHONE);
    await signInAs(owner, 'owner');
    await owner.open(`${scheme}/home`);
    const { page } = owner;
    await page.getByRole('heading', { name: /^Your home is expected/ }).waitFor();
    expect(await smallTargets(owner)).toEqual([]);
    expect(await axeFaultsAtBothSizes(page)).toEqual([]);
    await page.setViewportSize(PHONE);
    await page.getByRole('button', { name: 'I have the letter' }).click();
    await page.getByText('We know that our letter has reached you.').waitFor();
    await page.getByRole('button', { name: 'That suits me' }).click();
    await page.getByRole('heading', { name: 'Our visit is settled' }).waitFor();

    await page.getByRole('button', { name: 'Report a crack or a worry' }).click();
    await page.getByLabel('What is it?').fill(title);
    await page.getByLabel('What do you see, where, and since when?').fill('A fine line since May.');
    await page
      .locator('input[type=file]')
      .last()
      .setInputFiles({
        ...{ name: 'crack.jpg', mimeType: 'image/jpeg', buffer: await aPhotograph(owner) },
      });
    await page.getByLabel('What it shows').fill('The crack');
    await page.getByRole('button', { name: 'Send the report' }).click();
    await page
      .getByText(/Someone will answer by/)
      .first()
      .waitFor();

    await assessor.open(`${scheme}/owners/inbox`);
    await assessor.page.getByRole('link', { name: title }).click();
    await assessor.page.getByLabel('Answer to the owner').fill('It was there before. We watch it.');
    await assessor.page.getByRole('button', { name: 'Send the answer' }).click();
    await assessor.page.getByText('It was there before. We watch it.').first().waitFor();

    await page.reload();
    await page.getByText(title).first().click();
    await page.getByText('It was there before. We watch it.').last().waitFor();
    expect(
      await answered(second, batch.replace('/owners/letters/', '/letter-batches/')),
    ).toMatchObject({
      batch: { deliveries: { sent: 1, failed: 0, acknowledged: 1 } },
    });
  },
);
