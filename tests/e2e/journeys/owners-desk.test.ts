import { expect } from 'vitest';
import { countOf } from '../drivers/imports.ts';
import { journey } from '../drivers/journey.ts';
import {
  addUndertaking,
  changeTelephone,
  closeUndertaking,
  sendParties,
} from '../drivers/owners.ts';
import { addressOf } from '../drivers/schemes.ts';
import { signInAs } from '../drivers/sign-in.ts';

journey(
  'parties are brought in, a promise is made and kept, and owners get another number to ask at',
  async ({ visit }) => {
    // told apart from those of another go
    const mark = crypto.randomUUID().slice(0, 6);
    const visitor = await visit();
    const { page } = visitor;
    await signInAs(visitor, 'assessor');
    const scheme = await addressOf(visitor);

    await sendParties(visitor, scheme, [
      'Building reference,Interest,Name,Address',
      `B0001,tenant,Cay ${mark},3 Middle Row`,
      `B9999,tenant,Dot ${mark},4 Middle Row`,
    ]);
    expect(await countOf(visitor, 'new parties')).toBe('1');
    expect(await countOf(visitor, 'with a problem')).toBe('1');
    await page.getByText('No building has the reference B9999.').waitFor();
    await page.getByText('1 party is added, 1 row is left out.').waitFor();
    await page.getByRole('button', { name: 'Take over' }).click();
    await page.getByText('Taken over.').waitFor();
    await visitor.open(`${scheme}/owners/parties?search=${mark}`);
    await page.getByText(`Cay ${mark}`).first().waitFor();
    expect(await page.getByText(`Dot ${mark}`).count()).toBe(0);

    const promise = `No lorries at night, ${mark}`;
    await addUndertaking(visitor, scheme, promise);
    await closeUndertaking(visitor, promise, 'Gate log of November');
    await page.getByText('Gate log of November').waitFor();
    await page.getByRole('row', { name: promise }).getByText('Done 1 Dec 2026').waitFor();

    const number = `01632 ${mark}`;
    const administrator = await visit();
    await signInAs(administrator, 'administrator');
    await changeTelephone(administrator, scheme, number);
    await administrator.page.getByText(number).waitFor();
    await administrator.page.getByText(/^version \d+, Administrator/).waitFor();
  },
);
