import { QueryTypes } from 'sequelize';
import { describe, expect, test } from 'vitest';
import {
  batchDetailSchema,
  batchSchema,
  recipientsSchema,
} from '../../../shared/schemas/letter-batches.ts';
import { heldLetterSettingsSchema } from '../../../shared/schemas/letter-settings.ts';
import { previewedTemplateSchema } from '../../../shared/schemas/letter-templates.ts';
import { letterSchema, listedLettersSchema } from '../../../shared/schemas/letters.ts';
import { Membership } from '../../../server/models/membership.ts';
import { Person } from '../../../server/models/person.ts';
import { remindLate } from '../../../server/letters/remind-late.ts';
import { aMember, anAdministrator, anAlignment, aPerson } from '../../support/factories.ts';
import { aBatch, aSentBatch, aTownOfOwners, keepSettings } from '../../support/letters.ts';
import { E, N } from '../../support/register.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { tokenOf } from '../../support/token-of.ts';
import { aParty, partyValues } from '../../support/parties.ts';

const tested = testApp();
const { app, services, letters } = tested;

function rowsIn<T extends object>(query: string, bind: unknown[]): Promise<T[]> {
  return services().database.query<T>(query, { type: QueryTypes.SELECT, bind });
}

/** A batch like another, sent forty days ago, to be answered so many days earlier; the first of its letters. */
async function sentLongAgo(batchId: string, earlier = 40): Promise<{ letterId: string }> {
  const [row] = await rowsIn<{ letterId: string }>(
    `with batch as (
       insert into letter_batches (id, scheme_id, number, kind, template_version, settings_version,
         run_id, letters, prepared_by, prepared_at, state, checked_by, checked_at, sent_by, sent_at)
       select gen_random_uuid(), scheme_id, number + 100, kind, template_version, settings_version,
         run_id, letters, prepared_by, prepared_at, state, checked_by, checked_at, sent_by,
         sent_at - interval '40 days'
       from letter_batches where id = $1 returning id
     ), copies as (
       insert into letters (id, scheme_id, batch_id, number, party_id, channel, name, address, email,
         subject, body, facts, reasons, answer_by)
       select gen_random_uuid(), scheme_id, batch.id, number, party_id, channel, name, address,
         email, subject, body, facts, reasons, answer_by - $2::integer
       from letters, batch where batch_id = $1 returning id, number
     )
     select id as "letterId" from copies order by number limit 1`,
    [batchId, earlier],
  );
  if (row === undefined) throw new Error('There is no such batch.');
  return row;
}

describe('who gets a letter', () => {
  test('is whom the rules name, each with the reason', async () => {
    const town = await aTownOfOwners(tested);
    const asked = { kind: 'first information', leftOut: [], chosen: [] };
    const answer = await town.firstAgent.post(`${town.address}/letter-batches/preview`).send(asked);
    const found = recipientsSchema.parse(answer.body);
    expect(found).toMatchObject({ letters: 2, byMail: 1, byPost: 1, runNumber: 1 });
    expect(found.without).toBeGreaterThan(10);
    expect(found.recipients).toMatchObject([
      {
        name: 'Ada of the second house',
        reasons: [{ why: 'The ground may sink by 1 mm or more', building: 'T1-2' }],
      },
      { name: 'Bea of the third house', channel: 'post' },
    ]);
  });

  test('is also who is near to a shaft of the line that the register shows, as long as it stands there', async () => {
    const town = await aTownOfOwners(tested);
    const { firstAgent, address, scheme, option } = town;
    const far = await aParty(firstAgent, scheme, {
      ...{ name: 'Cay, far away', email: 'cay@example.org' },
      interests: [{ kind: 'tenant', buildingId: town.house('far'), from: null, to: null }],
    });
    const reasonsOf = async () => {
      const asked = { kind: 'first information', leftOut: [], chosen: [] };
      const answer = await firstAgent.post(`${address}/letter-batches/preview`).send(asked);
      const { recipients } = recipientsSchema.parse(answer.body);
      return recipients.find(({ partyId }) => partyId === far.id)?.reasons;
    };
    // the house stands from 200 m to 210 m north
    const shaftAt = (north: number) => [
      { name: 'North shaft', east: E + 5, north: N + north, source: 'Drawing 12' },
    ];
    expect(await reasonsOf()).toBeUndefined();
    await option.update({ shafts: shaftAt(240) });
    expect(await reasonsOf()).toEqual([{ why: 'Within 30 m of a shaft', building: 'far' }]);
    await option.update({ shafts: shaftAt(240.5) });
    expect(await reasonsOf()).toBeUndefined();
    await anAlignment(scheme, { shafts: shaftAt(240) });
    expect(await reasonsOf()).toBeUndefined();
    const administrator = await signIn(app(), await anAdministrator());
    const { settings } = heldLetterSettingsSchema.parse((await administrator.get(`${address}/letter-settings`)).body); // prettier-ignore
    const wider = settings.rules.map((rule) => (rule.shaftWithin === null ? rule : { ...rule, shaftWithin: 31 })); // prettier-ignore
    await keepSettings(administrator, scheme, { rules: wider });
    expect(await reasonsOf()).toHaveLength(1);
  });

  test('leaves out with a reason, and takes in whom somebody chose', async () => {
    const town = await aTownOfOwners(tested);
    const far = await aParty(town.firstAgent, town.scheme, {
      ...{ name: 'Cay, far away', email: 'cay@example.org' },
      interests: [{ kind: 'tenant', buildingId: town.house('far'), from: null, to: null }],
    });
    const asked = {
      kind: 'first information',
      leftOut: [{ partyId: town.byPost.id, why: 'Was told in person.' }],
      chosen: [{ partyId: far.id, why: 'Asked for it.' }],
      text: null,
      expected: 2,
    };
    const answer = await town.firstAgent.post(`${town.address}/letter-batches`).send(asked);
    expect(answer.status).toBe(201);
    const { id } = batchSchema.parse(answer.body);
    const detail = batchDetailSchema.parse(
      (await town.firstAgent.get(`${town.address}/letter-batches/${id}`)).body,
    );
    expect(detail.letters.map(({ name }) => name)).toEqual(['Ada of the second house', far.name]);
    expect(detail.leftOut).toEqual([
      { partyId: town.byPost.id, name: town.byPost.name, why: 'Was told in person.' },
    ]);
    expect(detail.chosen).toEqual([{ partyId: far.id, name: far.name, why: 'Asked for it.' }]);
  });

  test('that a batch made an exception of is known under the party that stands, while letters can go there', async () => {
    const town = await aTownOfOwners(tested);
    const { firstAgent, scheme, address } = town;
    const tenant = { kind: 'tenant', buildingId: town.house('far'), from: null, to: null } as const;
    const [cay, dee] = [
      await aParty(firstAgent, scheme, { name: 'Cay', email: null, channel: 'post', interests: [tenant] }), // prettier-ignore
      await aParty(firstAgent, scheme, { name: 'Dee', email: null, channel: 'post', interests: [tenant] }), // prettier-ignore
    ];
    const chosen = [cay, dee].map(({ id }) => ({ partyId: id, why: 'Asked for it.' }));
    const { id } = await aBatch(town, 'first information', 4, { chosen });
    const why = 'Asked for it.';
    const chosenNow = async () =>
      batchDetailSchema.parse((await firstAgent.get(`${address}/letter-batches/${id}`)).body)
        .chosen;
    const merge = { version: dee.version, other: { id: cay.id, version: cay.version } };
    await firstAgent.post(`${address}/parties/${dee.id}/merge`).send(merge).expect(200);
    const merged = { partyId: dee.id, name: 'Dee', why };
    expect(await chosenNow()).toEqual([merged]);
    await services().database.query(
      `update interests set to_day = current_date - 1 where party_id = $1`,
      { bind: [dee.id] },
    );
    expect(await chosenNow()).toEqual([{ ...merged, partyId: null }]);
  });

  test('goes to a representative in somebody’s stead', async () => {
    const town = await aTownOfOwners(tested);
    const agent = await aParty(town.firstAgent, town.scheme, {
      ...{ name: 'Agents and sons', email: 'agents@example.org', kind: 'organisation' },
    });
    const { interests, ...kept } = town.byMail;
    const values = {
      ...{ kind: kept.kind, name: kept.name, address: kept.address, email: kept.email },
      ...{ channel: kept.channel, representedBy: agent.id },
      interests: interests.map(({ building, kind, from, to }) => ({
        ...{ buildingId: building.id, kind, from, to },
      })),
    };
    const changed = await town.firstAgent
      .put(`${town.address}/parties/${kept.id}`)
      .send({ version: kept.version, values });
    expect(changed.status).toBe(200);
    await aSentBatch(tested, town);
    const sent = letters.filter(({ to }) => to === 'agents@example.org');
    expect(sent[0]?.text).toContain('Dear Agents and sons, for Ada of the second house,');
  });

  test('says who had a letter of the kind for the building, or has it waiting, and the checker reads it too', async () => {
    const town = await aTownOfOwners(tested);
    const { firstAgent, address } = town;
    const earlier = async (kind = 'first information') => {
      const asked = { kind, leftOut: [], chosen: [] };
      const answer = await firstAgent.post(`${address}/letter-batches/preview`).send(asked);
      return recipientsSchema.parse(answer.body).recipients.map((one) => one.earlier);
    };
    const detail = async (id: string) =>
      batchDetailSchema.parse((await firstAgent.get(`${address}/letter-batches/${id}`)).body);
    expect(await earlier()).toEqual([[], []]);
    const sent = await aSentBatch(tested, town);
    const leftOut = [{ partyId: town.byPost.id, why: 'Had it.' }];
    const waiting = await aBatch(town, 'first information', 1, { leftOut });
    const one = { batchNumber: 1, sentAt: sent.sentAt };
    const two = { batchNumber: 2, sentAt: null, buildings: ['T1-2'] };
    expect(await earlier()).toMatchObject([[two, one], [one]]);
    expect((await earlier('condition survey')).flat()).toEqual([]);
    const read = await detail(waiting.id);
    expect(read.earlier).toMatchObject([{ letterId: read.letters[0]?.id, had: [one] }]);
    expect((await detail(sent.id)).earlier).toEqual([]);
    // taken back, it waits for nobody; and what failed was had by nobody
    await firstAgent.post(`${address}/letter-batches/${waiting.id}/withdraw`).expect(200);
    await services().database.query(
      `update outbox set state = 'failed' where letter_id in (select id from letters where batch_id = $1)`,
      { bind: [sent.id] },
    );
    expect(await earlier()).toMatchObject([[], [one]]);
  });

  test('knows what a party had before it was merged', async () => {
    const town = await aTownOfOwners(tested);
    const { firstAgent, scheme, address, byMail } = town;
    await aSentBatch(tested, town);
    const same = await aParty(firstAgent, scheme, {
      ...{ name: 'Ada again', email: 'ada-again@example.org' },
      interests: [{ kind: 'manager', buildingId: town.house('T1-2'), from: null, to: null }],
    });
    const merge = { version: same.version, other: { id: byMail.id, version: byMail.version } };
    await firstAgent.post(`${address}/parties/${same.id}/merge`).send(merge).expect(200);
    const asked = { kind: 'first information', leftOut: [], chosen: [] };
    const answer = await firstAgent.post(`${address}/letter-batches/preview`).send(asked);
    const found = recipientsSchema.parse(answer.body).recipients;
    expect(found.find(({ partyId }) => partyId === same.id)?.earlier).toMatchObject([
      { batchNumber: 1 },
    ]);
    const { id } = await aBatch(town);
    const detail = await firstAgent.get(`${address}/letter-batches/${id}`);
    expect(batchDetailSchema.parse(detail.body).earlier).toHaveLength(2);
  });

  test('is refused where the list has changed since it was seen', async () => {
    const town = await aTownOfOwners(tested);
    const asked = { kind: 'first information', leftOut: [], chosen: [], text: null, expected: 3 };
    const answer = await town.firstAgent.post(`${town.address}/letter-batches`).send(asked);
    expect(answer.status).toBe(409);
    expect(answer.text).toContain('By now 2 would get the letter, not 3.');
    expect(await rowsIn('select id from letter_batches where scheme_id = $1', [town.scheme.id])).toEqual([]); // prettier-ignore
  });
});

describe('a batch', () => {
  test('is checked by another person, never by whoever prepared it, in the database neither', async () => {
    const town = await aTownOfOwners(tested);
    const { id } = await aBatch(town);
    const at = `${town.address}/letter-batches/${id}`;
    const check = { verdict: 'checked', comment: '' };
    expect((await town.firstAgent.post(`${at}/check`).send(check)).status).toBe(403);
    expect((await town.firstAgent.post(`${at}/send`)).status).toBe(409);
    await expect(
      services().database.query(
        `update letter_batches set state = 'checked', checked_by = prepared_by, checked_at = now() where id = $1`,
        { bind: [id] },
      ),
    ).rejects.toThrow('nobody_checks_their_own_letters');
    expect((await town.secondAgent.post(`${at}/check`).send(check)).status).toBe(200);
    expect((await town.secondAgent.post(`${at}/check`).send(check)).status).toBe(409);
  });

  test('is returned with a comment only, and then stays so', async () => {
    const town = await aTownOfOwners(tested);
    const { id } = await aBatch(town);
    const at = `${town.address}/letter-batches/${id}/check`;
    const none = await town.secondAgent.post(at).send({ verdict: 'returned', comment: '' });
    expect(none.status).toBe(422);
    const back = { verdict: 'returned', comment: 'The day is wrong.' };
    const returned = await town.secondAgent.post(at).send(back);
    expect(batchSchema.parse(returned.body)).toMatchObject({
      state: 'returned',
      comment: 'The day is wrong.',
    });
    await expect(
      services().database.query(`update letter_batches set state = 'checked' where id = $1`, {
        bind: [id],
      }),
    ).rejects.toThrow('stay so');
  });

  test('is taken back by whoever prepared it', async () => {
    const town = await aTownOfOwners(tested);
    const { id } = await aBatch(town);
    const at = `${town.address}/letter-batches/${id}/withdraw`;
    expect((await town.secondAgent.post(at)).status).toBe(403);
    expect(batchSchema.parse((await town.firstAgent.post(at)).body).state).toBe('withdrawn');
  });

  test('goes out by mail with a PDF and a link that sets a password, and waits for the post', async () => {
    const town = await aTownOfOwners(tested, { email: 'first@example.org' });
    const batch = await aSentBatch(tested, town);
    expect(batch).toMatchObject({ state: 'sent', byPost: 1 });
    const mail = letters.find(({ to }) => to === 'first@example.org');
    expect(mail?.subject).toMatch(/^A new tunnel near your building$/);
    expect(mail?.text).toContain('The ground will sink by about');
    expect(mail?.attachments).toMatchObject([
      { filename: 'letter.pdf', contentType: 'application/pdf' },
    ]);
    const kept = await rowsIn<{ parts: unknown }>('select parts from outbox where recipient = $1', [
      'first@example.org',
    ]);
    expect(JSON.stringify(kept)).not.toContain(tokenOf(mail));
    const used = await visitor(app()).then((agent) =>
      agent.post(`/api/links/${tokenOf(mail)}`).send({ password: 'a long and odd password' }),
    );
    expect(used.status).toBeLessThan(300);
    const person = await Person.findOne({ where: { email: 'first@example.org' } });
    expect(await Membership.findOne({ where: { personId: person?.id } })).toMatchObject({
      schemeId: town.scheme.id,
      role: 'owner',
    });
    const detail = batchDetailSchema.parse(
      (await town.firstAgent.get(`${town.address}/letter-batches/${batch.id}`)).body,
    );
    expect(detail.letters.map(({ delivery }) => delivery)).toEqual(['sent', 'to be printed']);
    await town.firstAgent.post(`${town.address}/letter-batches/${batch.id}/printed`).expect(200);
    const [, post] = batchDetailSchema.parse(
      (await town.firstAgent.get(`${town.address}/letter-batches/${batch.id}`)).body,
    ).letters;
    expect(post?.delivery).toBe('printed');
  });

  test('is told who prepared and who sent it in the audit trail', async () => {
    const town = await aTownOfOwners(tested);
    const { id } = await aSentBatch(tested, town);
    const trail = await rowsIn<{ action: string; person_id: string }>(
      'select action, person_id from audit_entries where subject_id = $1 order by id',
      [id],
    );
    expect(trail).toEqual([
      { action: 'prepare letters', person_id: town.first.id },
      { action: 'check letters', person_id: town.second.id },
      { action: 'send letters', person_id: town.second.id },
    ]);
  });
});

describe('free text', () => {
  const TEXT = {
    subject: 'The lift at {place}',
    body: 'Dear {name},\n\nThe lift is mended.\n\n{link}',
  };

  test('is written for its batch, kept with its marks, and said with them put in', async () => {
    const town = await aTownOfOwners(tested, { email: 'lift@example.org' });
    const chosen = [{ partyId: town.byMail.id, why: 'Asked about the lift.' }];
    const { id } = await aBatch(town, 'free text', 1, { chosen, text: TEXT });
    const detail = batchDetailSchema.parse(
      (await town.secondAgent.get(`${town.address}/letter-batches/${id}`)).body,
    );
    expect(detail.text).toEqual(TEXT);
    const whole = await town.firstAgent.get(
      `${town.address}/letters/${detail.letters[0]?.id ?? ''}`,
    );
    const { subject, parts } = letterSchema.parse(whole.body);
    expect(subject).toBe('The lift at your building');
    expect(parts.slice(0, 2)).toEqual(['Dear Ada of the second house,', 'The lift is mended.']);
    expect(parts).toContainEqual({ link: 'Open your page' });
    expect(await rowsIn('select version from letter_templates where scheme_id = $1', [town.scheme.id])).toEqual([]); // prettier-ignore
    await expect(
      services().database.query(`update letter_batches set own_body = 'Other' where id = $1`, {
        bind: [id],
      }),
    ).rejects.toThrow('what was prepared never changes');
  });

  test('is looked at as those who were chosen will read it', async () => {
    const town = await aTownOfOwners(tested);
    const at = `${town.address}/letter-templates/free text/preview`;
    const of = async (asked: object) => {
      const body = { ...TEXT, leftOut: [], chosen: [], partyId: null, ...asked };
      return previewedTemplateSchema.parse((await town.firstAgent.post(at).send(body)).body);
    };
    const chosen = [{ partyId: town.byPost.id, why: 'Asked about the lift.' }];
    expect(await of({ chosen })).toMatchObject({
      parties: [{ id: town.byPost.id }],
      letter: { name: 'Bea of the third house', subject: 'The lift at your building' },
    });
    expect((await of({})).parties).toHaveLength(2);
    expect(await of({ body: '{nmae}' })).toMatchObject({
      faults: ['Line 1: there is no mark {nmae}.'],
      letter: null,
    });
  });

  test('is refused with marks that are not known, without a text, and other kinds with one', async () => {
    const town = await aTownOfOwners(tested);
    const at = `${town.address}/letter-batches`;
    const chosen = [{ partyId: town.byMail.id, why: 'Asked.' }];
    const asked = { kind: 'free text', leftOut: [], chosen, expected: 1 };
    const bad = { ...TEXT, body: 'Dear {nmae},' };
    const refused = await town.firstAgent.post(at).send({ ...asked, text: bad });
    expect(refused.status).toBe(422);
    expect(refused.text).toContain('"text.body"');
    expect((await town.firstAgent.post(at).send({ ...asked, text: null })).status).toBe(422);
    const other = { ...asked, kind: 'first information', chosen: [], expected: 2, text: TEXT };
    expect((await town.firstAgent.post(at).send(other)).status).toBe(422);
    expect(await rowsIn('select id from letter_batches where scheme_id = $1', [town.scheme.id])).toEqual([]); // prettier-ignore
  });
});

describe('a letter', () => {
  test('never changes, whatever becomes of the party, and is read whole', async () => {
    const town = await aTownOfOwners(tested);
    const { id } = await aSentBatch(tested, town);
    const detail = batchDetailSchema.parse(
      (await town.firstAgent.get(`${town.address}/letter-batches/${id}`)).body,
    );
    const [first] = detail.letters;
    await expect(
      services().database.query(`update letters set body = '' where id = $1`, {
        bind: [first?.id],
      }),
    ).rejects.toThrow();
    const whole = await town.firstAgent.get(`${town.address}/letters/${first?.id ?? ''}`);
    const letter = letterSchema.parse(whole.body);
    expect(letter).toMatchObject({ email: 'ada@example.org', delivery: 'sent' });
    expect(letter.parts).toContainEqual({ link: 'Open your page' });
    const pdf = await town.firstAgent.get(`${town.address}/letters/${first?.id ?? ''}/pdf`);
    expect(pdf.headers['content-type']).toBe('application/pdf');
  });

  test('says a hostile name as it is written, in a mail of one recipient', async () => {
    const name = `<img src=x> {cautions} =cmd() ${'مالك 🏠 '.repeat(20)}`.trim();
    const town = await aTownOfOwners(tested, { name, email: 'hostile@example.org' });
    await aSentBatch(tested, town);
    const mail = letters.find(({ to }) => to === 'hostile@example.org');
    expect(mail?.text).toContain(`Dear ${name},`);
    expect(mail?.html).toContain('Dear &lt;img src=x&gt; {cautions} =cmd() مالك 🏠');
    expect(mail?.html).not.toContain('<img');
    expect(mail?.subject).toBe('A new tunnel near your building');
    const broken = { ...partyValues({ name: 'Ada\r\nBcc: eve@example.org' }) };
    const refused = await town.firstAgent.post(`${town.address}/parties`).send(broken);
    expect(refused.status).toBe(422);
  });

  test('is found by its building and its party, and by a stranger not at all', async () => {
    const town = await aTownOfOwners(tested);
    await aSentBatch(tested, town);
    const of = async (query: string) =>
      listedLettersSchema.parse(
        (await town.firstAgent.get(`${town.address}/letters?${query}`)).body,
      );
    const found = await of(`building=${town.house('T1-2')}`);
    expect(found).toMatchObject([{ name: 'Ada of the second house', kind: 'first information' }]);
    expect(await of(`party=${town.byPost.id}`)).toMatchObject([{ channel: 'post' }]);
    expect(await of('overdue=answer')).toEqual([]);
    const stranger = await signIn(app(), await aPerson());
    const at = `${town.address}/letters/${found[0]?.id ?? ''}`;
    expect((await stranger.get(at)).status).toBe(404);
    const elsewhere = await aTownOfOwners(tested, { email: 'other@example.org' });
    const foreign = `${elsewhere.address}/letters/${found[0]?.id ?? ''}`;
    expect((await elsewhere.firstAgent.get(foreign)).status).toBe(404);
  });

  test('that nobody answers is reminded of once, and told of among those without an answer', async () => {
    const town = await aTownOfOwners(tested, { email: 'late@example.org' });
    const { id } = await aSentBatch(tested, town);
    await sentLongAgo(id);
    const of = (to: string) => letters.filter((letter) => letter.to === to);
    const before = of('late@example.org').length;
    expect(await remindLate(services())).toBeGreaterThan(0);
    await tested.outbox().idle();
    const [reminder] = of('late@example.org').slice(before);
    expect(reminder?.subject).toBe('A reminder: A new tunnel near your building');
    expect(await remindLate(services())).toBe(0);
    const overdue = await town.firstAgent.get(`${town.address}/letters?overdue=answer`);
    const escalated = await town.firstAgent.get(`${town.address}/letters?overdue=call`);
    expect(listedLettersSchema.parse(escalated.body)).toEqual([]);
    const found = listedLettersSchema.parse(overdue.body);
    expect(found.map(({ name }) => name)).toEqual([town.byMail.name, town.byPost.name]);
    expect(found[0]?.remindedAt).not.toBeNull();
  });

  test('is not late before the day that it gives', async () => {
    const town = await aTownOfOwners(tested);
    const { id } = await aSentBatch(tested, town);
    await sentLongAgo(id, 0);
    expect(await remindLate(services())).toBe(0);
    const overdue = await town.firstAgent.get(`${town.address}/letters?overdue=answer`);
    expect(listedLettersSchema.parse(overdue.body)).toEqual([]);
  });

  test('gives a working day to answer by, round the holidays of the scheme', async () => {
    const town = await aTownOfOwners(tested);
    const dayIn = (days: number) => new Date(Date.now() + days * 86_400_000);
    const isoOf = (moment: Date) => moment.toISOString().slice(0, 10);
    // from the day on which three weeks end there are ten holidays
    const holidays = Array.from({ length: 10 }, (_, k) => ({
      ...{ date: isoOf(dayIn(21 + k)), name: 'Harbour days' },
    }));
    await keepSettings(await signIn(app(), await anAdministrator()), town.scheme, { holidays });
    const { id } = await aBatch(town);
    const weekend = [0, 6];
    const days = Array.from({ length: 4 }, (_, k) => dayIn(31 + k));
    const then = days.find((day) => !weekend.includes(day.getUTCDay()));
    const [row] = await rowsIn<{ day: string; body: string }>(
      'select answer_by::text as day, body from letters where batch_id = $1 limit 1',
      [id],
    );
    expect(row?.day).toBe(then === undefined ? undefined : isoOf(then));
    const spoken = then?.toLocaleDateString('en-GB', { day: 'numeric', month: 'long', timeZone: 'UTC' }); // prettier-ignore
    expect(row?.body).toContain(spoken);
  });

  test('is acknowledged by telephone once, and never reminded of', async () => {
    const town = await aTownOfOwners(tested);
    const { id } = await aSentBatch(tested, town);
    const { letterId } = await sentLongAgo(id);
    const at = `${town.address}/letters/${letterId}/acknowledgement`;
    expect((await town.firstAgent.post(at).send({ how: '' })).status).toBe(422);
    await town.firstAgent.post(at).send({ how: 'By telephone' }).expect(204);
    await town.firstAgent.post(at).send({ how: 'Twice' }).expect(204);
    expect(
      await rowsIn('select how from letter_acknowledgements where letter_id = $1', [letterId]),
    ).toEqual([{ how: 'By telephone' }]);
    expect(await remindLate(services())).toBe(0);
  });
});

test('who may not is refused', async () => {
  const town = await aTownOfOwners(tested);
  const at = `${town.address}/letter-batches`;
  const asked = { kind: 'first information', leftOut: [], chosen: [], text: null, expected: 2 };
  const designer = await signIn(app(), await aMember(town.scheme, 'designer'));
  expect((await designer.get(at)).status).toBe(403);
  expect((await designer.post(at).send(asked)).status).toBe(403);
  expect((await visitor(app()).then((agent) => agent.get(at))).status).toBe(401);
  expect((await town.firstAgent.post(at).send({ ...asked, kind: 'a threat' })).status).toBe(422);
});
