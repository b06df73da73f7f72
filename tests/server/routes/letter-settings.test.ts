import { QueryTypes } from 'sequelize';
import { describe, expect, test } from 'vitest';
import { batchDetailSchema } from '../../../shared/schemas/letter-batches.ts';
import {
  defaultLetterSettings,
  heldLetterSettingsSchema,
} from '../../../shared/schemas/letter-settings.ts';
import { letterSchema } from '../../../shared/schemas/letters.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { heldSettings } from '../../../server/models/letter-settings.ts';
import { aMember, aPerson, aScheme } from '../../support/factories.ts';
import { aBatch, aTownOfOwners, keepSettings } from '../../support/letters.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const tested = testApp();
const { app, services } = tested;

const PROMISE = {
  words: 'What the tunnel cracks, we mend and pay.',
  source: 'Promise 2 (made up)',
};

async function anOffice() {
  const scheme = await aScheme();
  const administrator = await signIn(app(), await aPerson({ isAdministrator: true }));
  return { scheme, administrator, address: `/api/schemes/${scheme.id}/letter-settings` };
}

describe('what letters go by', () => {
  test('promises nothing of money until somebody writes it, and then keeps it with its source', async () => {
    const { scheme, administrator, address } = await anOffice();
    const first = heldLetterSettingsSchema.parse((await administrator.get(address)).body);
    expect(first).toMatchObject({ version: 0, settings: { timeZone: 'UTC', holidays: [] } });
    expect(first.settings.repairs.words).toBe('Tell us about any crack. We will come and look.');
    const holidays = [{ date: '2027-05-03', name: 'May day' }];
    const terms = { repairs: PROMISE, timeZone: 'Europe/London', holidays };
    const kept = await keepSettings(administrator, scheme, terms);
    expect(kept).toMatchObject({ version: 1, settings: terms });
    const rows = await services().database.query(
      `select version, settings -> 'repairs' as repairs, settings ->> 'timeZone' as zone
       from letter_settings where scheme_id = $1`,
      { type: QueryTypes.SELECT, bind: [scheme.id] },
    );
    expect(rows).toEqual([{ version: 1, repairs: PROMISE, zone: 'Europe/London' }]);
    const entry = await AuditEntry.findOne({
      where: { schemeId: scheme.id, action: 'change letter settings' },
      rejectOnEmpty: true,
    });
    expect(entry).toMatchObject({ after: { settings: { repairs: PROMISE } } });
  });

  test('a rule may mean buildings near a shaft, and older rules know of none', async () => {
    const { scheme, administrator } = await anOffice();
    const { settings } = await heldSettings(services().database, scheme);
    expect(settings.rules.filter(({ shaftWithin }) => shaftWithin !== null)).toMatchObject([
      { kind: 'first information', why: 'Within 30 m of a shaft', shaftWithin: 30 },
    ]);
    const older = settings.rules.map((rule) => ({ ...rule, shaftWithin: undefined }));
    await services().database.query(
      'insert into letter_settings (scheme_id, version, settings) values ($1, 1, $2::jsonb)',
      { bind: [scheme.id, JSON.stringify({ ...settings, rules: older })] },
    );
    const read = await heldSettings(services().database, scheme);
    expect(read.settings.rules.every(({ shaftWithin }) => shaftWithin === null)).toBe(true);
    const rules = read.settings.rules.map((rule) => ({ ...rule, shaftWithin: 12.5 }));
    expect((await keepSettings(administrator, scheme, { rules })).settings.rules).toEqual(rules);
    const bad = rules.map((rule) => ({ ...rule, shaftWithin: 0 }));
    await expect(keepSettings(administrator, scheme, { rules: bad })).rejects.toThrow(
      'shaftWithin',
    );
  });

  test('an older version, which says nothing of promises, is read with the first ones', async () => {
    const { scheme, administrator, address } = await anOffice();
    const { repairs, answerDays, timeZone, holidays, ...older } = defaultLetterSettings('2026-12-01'); // prettier-ignore
    await services().database.query(
      'insert into letter_settings (scheme_id, version, settings) values ($1, 1, $2::jsonb)',
      { bind: [scheme.id, JSON.stringify(older)] },
    );
    const { settings } = await heldSettings(services().database, scheme);
    expect(settings).toMatchObject({ repairs, answerDays, timeZone, holidays });
    expect((await administrator.get(address)).status).toBe(200);
  });

  test.each([
    ['a zone that nobody knows', { timeZone: 'Europe/Atlantis' }, 'settings.timeZone'],
    ['an offset, which knows no summer', { timeZone: '+01:00' }, 'settings.timeZone'],
    ['a day that is none', { holidays: [{ date: '2027-02-30', name: 'x' }] }, 'settings.holidays.0.date'], // prettier-ignore
    ['a holiday without a name', { holidays: [{ date: '2027-02-03', name: '' }] }, 'settings.holidays.0.name'], // prettier-ignore
    ['a promise without a source', { repairs: { words: 'We pay.', source: '' } }, 'settings.repairs.source'], // prettier-ignore
    ['an answer at once', { answerDays: { question: 0, concern: 2, claim: 2, correction: 2 } }, 'settings.answerDays.question'], // prettier-ignore
  ])('%s is refused', async (_, some, path) => {
    const { administrator, address } = await anOffice();
    const settings = { ...defaultLetterSettings('2026-12-01'), ...some };
    const answer = await administrator.post(address).send({ basedOn: 0, settings });
    expect(answer.status).toBe(422);
    expect(answer.text).toContain(`"${path}"`);
  });

  test('is changed by an administrator alone, on top of what was seen', async () => {
    const { scheme, administrator, address } = await anOffice();
    const settings = defaultLetterSettings('2026-12-01');
    const assessor = await signIn(app(), await aMember(scheme, 'assessor'));
    const stranger = await signIn(app(), await aPerson());
    const asked = { basedOn: 0, settings };
    expect((await assessor.get(address)).status).toBe(200);
    expect((await assessor.post(address).send(asked)).status).toBe(403);
    expect((await stranger.get(address)).status).toBe(404);
    expect((await visitor(app()).then((agent) => agent.post(address).send(asked))).status).toBe(401); // prettier-ignore
    expect((await administrator.post(address).send(asked)).status).toBe(201);
    expect((await administrator.post(address).send(asked)).status).toBe(409);
  });
});

test('what is promised of repairs stands in letters as it was written', async () => {
  const town = await aTownOfOwners(tested);
  const administrator = await signIn(app(), await aPerson({ isAdministrator: true }));
  await keepSettings(administrator, town.scheme, { repairs: PROMISE });
  const { id } = await aBatch(town);
  const detail = await town.firstAgent.get(`${town.address}/letter-batches/${id}`);
  const [letter] = batchDetailSchema.parse(detail.body).letters;
  const whole = await town.firstAgent.get(`${town.address}/letters/${letter?.id ?? ''}`);
  const { parts } = letterSchema.parse(whole.body);
  const said = parts.filter((part) => typeof part === 'string').join(' ');
  expect(said).toContain(PROMISE.words);
  expect(said.replace(PROMISE.words, '')).not.toMatch(/we pay/i);
});
