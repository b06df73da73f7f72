import { randomUUID } from 'node:crypto';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { QueryTypes } from 'sequelize';
import type TestAgent from 'supertest/lib/agent.js';
import { beforeEach, describe, expect, test } from 'vitest';
import { batchDetailSchema } from '../../../shared/schemas/letter-batches.ts';
import { matterSchema, mattersSchema } from '../../../shared/schemas/matter-answers.ts';
import { partyDetailSchema } from '../../../shared/schemas/party-answers.ts';
import { removeKept } from '../../../server/letters/remove-kept.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { placeOfPhotograph } from '../../../server/photographs/photograph-folder.ts';
import { aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { aBatch, aSentBatch, aTownOfOwners } from '../../support/letters.ts';
import { aMatter, aSignedInOwner } from '../../support/matters.ts';
import { aJpeg } from '../../support/photographs.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const tested = testApp();
const { app, services, letters, outbox } = tested;

let administrator: TestAgent;

beforeEach(async () => {
  administrator = await signIn(app(), await anAdministrator());
});

function rowsIn<Row extends object>(text: string, bind: readonly unknown[] = []) {
  return services().database.query<Row>(text, { type: QueryTypes.SELECT, bind: [...bind] });
}

async function erase(address: string, partyId: string): Promise<void> {
  const at = `${address}/parties/${partyId}`;
  const { party } = partyDetailSchema.parse((await administrator.get(at)).body);
  const asked = { version: party.version, ground: 'Asked', askedOn: '2026-11-20' };
  await administrator.post(`${at}/erase`).send(asked).expect(200);
}

/** An owner with a matter of theirs that has a photograph, and what an assessor of the scheme asks with. */
async function aMatterWithPhotograph(scheme: Scheme) {
  const owner = await aSignedInOwner(tested, scheme, { email: `${randomUUID()}@example.org` });
  const photograph = { id: randomUUID(), caption: 'Over the door of the Pepperells' };
  const matter = aMatter(owner.building.id, {
    ...{ title: 'A crack of the Pepperells', text: 'Call the Pepperells.' },
    photographs: [photograph],
  });
  const address = `/api/schemes/${scheme.id}`;
  await owner.agent.post(`${address}/own/matters`).send(matter).expect(201);
  const file = `matters/${matter.id}/photographs/${photograph.id}`;
  // of another content each, so that none is kept for another
  const told = aJpeg().toString('latin1').replace('colours', matter.id.slice(0, 7));
  const bytes = Buffer.from(told, 'latin1');
  await owner.agent.put(`${address}/own/${file}`).attach('file', bytes, 'a.jpg').expect(200); // prettier-ignore
  const assessor = await signIn(app(), await aMember(scheme, 'assessor'));
  return { owner, matter, photograph, address, assessor, file: `${address}/${file}` };
}

describe('what an erased party wrote', () => {
  test('is for the administrator alone: matters, searches, photographs, personal data', async () => {
    const { owner, matter, address, assessor, file } = await aMatterWithPhotograph(await aScheme());
    await assessor.get(file).expect(200);
    await erase(address, owner.party.id);
    const texts = [
      await assessor.get(`${address}/matters`),
      await assessor.get(`${address}/matters/${matter.id}`),
      await assessor.patch(`${address}/matters/${matter.id}`).send({ version: 1, state: 'closed' }),
    ];
    for (const { text } of texts) {
      expect(text).toContain('"isErased":true');
      expect(text).not.toContain('Pepperells');
    }
    const search = { text: 'pepperells' };
    expect((await assessor.get(`${address}/matters`).query(search)).body).toMatchObject({ total: 0 }); // prettier-ignore
    await assessor.get(file).expect(404);
    await assessor.get(`${address}/parties/${owner.party.id}/personal-data`).expect(404);

    const whole = matterSchema.parse((await administrator.get(`${address}/matters/${matter.id}`)).body); // prettier-ignore
    expect(whole).toMatchObject({ title: matter.title, messages: [{ text: matter.text }] });
    const found = await administrator.get(`${address}/matters`).query(search);
    expect(mattersSchema.parse(found.body).total).toBe(1);
    await administrator.get(file).expect(200);
    const held = await administrator.get(`${address}/parties/${owner.party.id}/personal-data`);
    expect(held.text).toContain('Call the Pepperells.');
  });

  test('is answered no more, nor noted on, nor taken over; it can be closed', async () => {
    const { owner, matter, address, assessor } = await aMatterWithPhotograph(await aScheme());
    const correction = aMatter(owner.building.id, {
      ...{ kind: 'correction', suggestion: { field: 'storeys', value: 4 } },
    });
    await owner.agent.post(`${address}/own/matters`).send(correction).expect(201);
    await erase(address, owner.party.id);
    const at = `${address}/matters/${matter.id}`;
    const sent = letters.length;
    for (const side of ['team', 'note']) {
      const message = { id: randomUUID(), version: 1, side, text: 'We come on Friday.' };
      const { text } = await assessor.post(`${at}/messages`).send(message).expect(409);
      expect(text).toContain('Nobody would read it.');
    }
    const message = { id: randomUUID(), text: 'Thank you.' };
    const taking = { version: 1, buildingVersion: 1, message };
    await assessor.post(`${address}/matters/${correction.id}/taking-over`).send(taking).expect(409);
    const written = 'select id from matter_messages where matter_id = any($1)';
    expect(await rowsIn(written, [[matter.id, correction.id]])).toHaveLength(2);
    await outbox().idle();
    expect(letters).toHaveLength(sent);
    await assessor.patch(at).send({ version: 1, state: 'closed' }).expect(200);
  });

  test('loses the days that were asked for', async () => {
    const scheme = await aScheme();
    const { owner, address, assessor } = await aMatterWithPhotograph(scheme);
    const author = await aMember(scheme, 'assessor');
    await services().database.query(
      `insert into appointments (id, scheme_id, building_id, party_id, purpose, starts_at, minutes, place,
         state, asked_for, created_by)
       values ($1, $2, $3, $4, 'access', now(), 60, 'door', 'another day asked for',
         '{"days": [], "words": "I am ill"}', $5)`,
      { bind: [randomUUID(), scheme.id, owner.building.id, owner.party.id, author.id] },
    );
    await erase(address, owner.party.id);
    expect(await rowsIn('select state, asked_for from appointments where party_id = $1', [owner.party.id])).toEqual([{ state: 'cancelled', asked_for: null }]); // prettier-ignore
    expect((await assessor.get(`${address}/appointments`)).text).not.toContain('I am ill');
  });
});

describe('letters to an erased party', () => {
  test('that wait to be sent are held back, and those of a batch are not sent', async () => {
    const town = await aTownOfOwners(tested, { email: 'waits@example.org' });
    await aSentBatch(tested, town);
    await services().database.query(
      `update outbox set state = 'waiting', ended_at = null where recipient = 'waits@example.org'`,
    );
    const { id } = await aBatch(town);
    await erase(town.address, town.byMail.id);
    await erase(town.address, town.byPost.id);
    const mails = await rowsIn<object>(`select state, server_words as words from outbox where recipient = 'waits@example.org'`); // prettier-ignore
    expect(mails).toEqual([
      { state: 'failed', words: 'Personal data were erased before it was sent.' },
    ]);
    const batch = `${town.address}/letter-batches/${id}`;
    await town.secondAgent.post(`${batch}/check`).send({ verdict: 'checked', comment: '' }).expect(200); // prettier-ignore
    const before = letters.length;
    await town.secondAgent.post(`${batch}/send`).expect(200);
    await outbox().idle();
    expect(letters).toHaveLength(before);
    await administrator.get(`${batch}/print-file`).expect(404);
    const detail = batchDetailSchema.parse((await town.firstAgent.get(batch)).body);
    expect(detail.letters).toMatchObject([
      { name: '', serverWords: null, delivery: 'not sent' },
      { name: '', delivery: 'not sent' },
    ]);
  });

  test('are kept until the day that the settings come to, which the party says', async () => {
    const town = await aTownOfOwners(tested, { email: 'kept@example.org' });
    await aSentBatch(tested, town);
    await erase(town.address, town.byMail.id);
    const at = `${town.address}/parties/${town.byMail.id}`;
    const { lettersKeptUntil } = partyDetailSchema.parse((await town.firstAgent.get(at)).body);
    const [then] = await rowsIn<{ day: string }>(`select (current_date + interval '12 years')::date::text as day`); // prettier-ignore
    expect(lettersKeptUntil).toBe(then?.day);
    expect(await removeKept(services())).toBe(0);
    expect(await rowsIn('select id from letters where party_id = $1', [town.byMail.id])).toHaveLength(1); // prettier-ignore
  });
});

test('an import that is open is given up when a party is erased, for its file may name them', async () => {
  const { owner, address, assessor } = await aMatterWithPhotograph(await aScheme());
  const file = Buffer.from(`Building reference,Interest,Name\n${owner.building.reference},tenant,Pepperell`); // prettier-ignore
  const sent = await assessor.post(`${address}/party-imports`).attach('file', file, 'parties.csv');
  expect([sent.status, sent.body]).toMatchObject([201, { state: 'checked' }]);
  await erase(address, owner.party.id);
  const { id } = sent.body as { id: string };
  expect(await rowsIn('select state, rows from party_imports where id = $1', [id])).toEqual([{ state: 'given up', rows: null }]); // prettier-ignore
  const trail = await AuditEntry.findOne({ where: { subjectId: owner.party.id, action: 'erase personal data' } }); // prettier-ignore
  expect(trail).toMatchObject({ after: { importsGivenUp: 1, mailsHeldBack: 0 } });
});

describe('once the day has passed', () => {
  async function pass(partyId: string, keepUntil: string): Promise<void> {
    const by = await anAdministrator();
    await services().database.query(
      `update parties set name = '', address = '', email = null, channel = 'post', erased_at = now()
       where id = $1`,
      { bind: [partyId] },
    );
    await services().database.query(
      `insert into party_erasures (party_id, ground, asked_on, erased_by, keep_until)
       values ($1, 'Asked', current_date, $2, $3)`,
      { bind: [partyId, by.id, keepUntil] },
    );
  }

  test('letters, mails, matters and photographs go, those of others stay', async () => {
    const town = await aTownOfOwners(tested, { email: 'gone@example.org' });
    await aSentBatch(tested, town);
    const gone = await aMatterWithPhotograph(town.scheme);
    const stays = await aMatterWithPhotograph(town.scheme);
    await outbox().idle();
    const files = await rowsIn<{ photograph_id: string; sha256: string }>(
      'select photograph_id, sha256 from matter_photograph_files',
    );
    const placeOf = (id: string) =>
      path.join(
        services().env.PHOTOGRAPHS_FOLDER,
        placeOfPhotograph(files.find((file) => file.photograph_id === id)?.sha256 ?? ''),
      );
    await pass(town.byMail.id, '2026-01-01');
    await pass(gone.owner.party.id, '2026-01-01');
    await pass(town.byPost.id, '2099-01-01');
    expect(await removeKept(services())).toBe(2);
    expect(await removeKept(services())).toBe(0);
    const left = await rowsIn<{ party_id: string }>(
      `select party_id from letters where scheme_id = $1
       union all select party_id from matters where scheme_id = $1
       union all select party_id from outbox where scheme_id = $1 and letter_id is null`,
      [town.scheme.id],
    );
    const matters = [stays.owner.party.id, stays.owner.party.id];
    expect(left.map((row) => row.party_id)).toEqual([town.byPost.id, ...matters]);
    expect(await rowsIn('select id from matter_messages where matter_id = $1', [gone.matter.id])).toEqual([]); // prettier-ignore
    expect(existsSync(placeOf(gone.photograph.id))).toBe(false);
    expect(existsSync(placeOf(stays.photograph.id))).toBe(true);
    const trail = await AuditEntry.findAll({ where: { schemeId: town.scheme.id, action: 'remove kept letters' } }); // prettier-ignore
    expect(trail).toMatchObject([{ personId: null, after: { letters: 1, matters: 1 } }]);
  });

  test('nothing else can be removed by the serving role', async () => {
    const town = await aTownOfOwners(tested, { email: 'closed@example.org' });
    await aSentBatch(tested, town);
    await expect(
      services().database.transaction(async (transaction) => {
        const options = { transaction };
        await services().database.query(`select set_config('groundsill.removes_kept', 'on', true)`, options); // prettier-ignore
        await services().database.query('delete from letters', options);
      }),
    ).rejects.toThrow('permission denied');
  });
});
