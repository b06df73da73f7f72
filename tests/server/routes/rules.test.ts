import { beforeAll, describe, expect, test } from 'vitest';
import {
  rulesVersionSchema,
  rulesVersionsSchema,
  type RuleSet,
} from '../../../shared/schemas/rules.ts';
import { schemeSchema } from '../../../shared/schemas/schemes.ts';
import { defaultRules } from '../../../server/commands/default-rules.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Person } from '../../../server/models/person.ts';
import { SchemeRules } from '../../../server/models/scheme-rules.ts';
import { Scheme } from '../../../server/models/scheme.ts';
import { aMember, aMembership, anAdministrator, aPerson } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const { app, services } = testApp();
const DATE = '2026-12-01';
let administrator: Person;

beforeAll(async () => {
  administrator = await anAdministrator();
});

function asAdministrator() {
  return signIn(app(), administrator);
}

let made = 0;

/** A scheme made through the front door, with its first rules. */
async function aSchemeWithRules(): Promise<Scheme> {
  const agent = await asAdministrator();
  made += 1;
  const named = { name: `With rules ${made}`, crs: 32631 };
  const answer = await agent.post('/api/schemes').send(named);
  return Scheme.findByPk(schemeSchema.parse(answer.body).id, { rejectOnEmpty: true });
}

function stricter(): RuleSet {
  const rules = defaultRules(DATE);
  const value = { settlement: 0.005, slope: 1 / 1000 };
  return { ...rules, screening: { value, source: 'common-practice', date: '2027-01-15' } };
}

function addressOf({ id }: { readonly id: string }): string {
  return `/api/schemes/${id}/rules`;
}

async function versionsOf(scheme: Scheme): Promise<number[]> {
  const kept = await SchemeRules.findAll({ where: { schemeId: scheme.id }, order: ['version'] });
  return kept.map(({ version }) => version);
}

describe('reading rules', () => {
  test('shows every version with who made it, the newest first', async () => {
    const scheme = await aSchemeWithRules();
    const agent = await asAdministrator();
    await agent.post(addressOf(scheme)).send({ basedOn: 1, rules: stricter() });
    const answer = await agent.get(addressOf(scheme));
    const versions = rulesVersionsSchema.parse(answer.body);
    const { id, name } = administrator;
    expect(versions).toMatchObject([
      { version: 2, createdBy: { id, name }, rules: { screening: { date: '2027-01-15' } } },
      {
        version: 1,
        createdBy: { id, name },
        rules: { holds: defaultRules(DATE).holds.map(({ name: hold }) => ({ name: hold })) },
      },
    ]);
  });

  test.each(['designer', 'assessor', 'witness'] as const)('is for the %s', async (role) => {
    const scheme = await aSchemeWithRules();
    const agent = await signIn(app(), await aMember(scheme, role));
    expect((await agent.get(addressOf(scheme))).status).toBe(200);
  });

  test('is not for owners, strangers or nobody', async () => {
    const scheme = await aSchemeWithRules();
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    expect((await owner.get(addressOf(scheme))).status).toBe(403);
    const stranger = await signIn(app(), await aMember(await aSchemeWithRules(), 'assessor'));
    expect((await stranger.get(addressOf(scheme))).status).toBe(404);
    expect((await (await visitor(app())).get(addressOf(scheme))).status).toBe(401);
  });
});

describe('changing rules', () => {
  test('adds a version, leaves the others, and tells the trail from what to what', async () => {
    const scheme = await aSchemeWithRules();
    const agent = await asAdministrator();
    const rules = stricter();
    const answer = await agent.post(addressOf(scheme)).send({ basedOn: 1, rules });
    expect(answer.status).toBe(201);
    expect(rulesVersionSchema.parse(answer.body)).toMatchObject({ version: 2, rules });
    expect(await versionsOf(scheme)).toEqual([1, 2]);
    const entries = await AuditEntry.findAll({
      where: { schemeId: scheme.id, action: 'change rules' },
    });
    expect(entries).toMatchObject([
      {
        personId: administrator.id,
        subjectKind: 'rules',
        subjectId: '2',
        before: { rules: { screening: { value: { settlement: 0.01 } } } },
        after: { rules: { screening: { value: { settlement: 0.005 } } } },
      },
    ]);
  });

  test('refuses those that were made from an older version', async () => {
    const scheme = await aSchemeWithRules();
    const agent = await asAdministrator();
    const change = { basedOn: 1, rules: stricter() };
    const answers = await Promise.all([1, 2].map(() => agent.post(addressOf(scheme)).send(change)));
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    const late = await agent.post(addressOf(scheme)).send(change);
    expect(late.body).toMatchObject({ error: { code: 'conflict' } });
    const early = await agent.post(addressOf(scheme)).send({ ...change, basedOn: 3 });
    expect(early.status).toBe(409);
    expect(await versionsOf(scheme)).toEqual([1, 2]);
  });

  test('refuses what is no rule, by its place', async () => {
    const scheme = await aSchemeWithRules();
    const rules = { ...stricter(), focus: { value: 'moon', source: 'burland-1995', date: DATE } };
    const agent = await asAdministrator();
    const answer = await agent.post(addressOf(scheme)).send({ basedOn: 1, rules });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path: 'rules.focus.value' }] } });
    expect(await versionsOf(scheme)).toEqual([1]);
  });

  test('is for the administrator, also one who holds a role', async () => {
    const scheme = await aSchemeWithRules();
    const change = { basedOn: 1, rules: stricter() };
    const member = await signIn(app(), await aMember(scheme, 'designer', 'assessor', 'witness'));
    expect((await member.post(addressOf(scheme)).send(change)).status).toBe(403);
    const stranger = await signIn(app(), await aPerson());
    expect((await stranger.post(addressOf(scheme)).send(change)).status).toBe(404);
    const unknown = await (
      await asAdministrator()
    )
      .post(addressOf({ id: UNKNOWN_ID }))
      .send(change);
    expect(unknown.status).toBe(404);
    expect(await versionsOf(scheme)).toEqual([1]);
    const both = await anAdministrator();
    await aMembership(scheme, both, 'assessor');
    expect((await (await signIn(app(), both)).post(addressOf(scheme)).send(change)).status).toBe(
      201,
    );
  });

  test('is refused in an archived scheme', async () => {
    const scheme = await aSchemeWithRules();
    await scheme.update({ archivedAt: new Date() });
    const agent = await asAdministrator();
    const answer = await agent.post(addressOf(scheme)).send({ basedOn: 1, rules: stricter() });
    expect(answer.body).toMatchObject({ error: { code: 'archived' } });
    expect((await agent.get(addressOf(scheme))).status).toBe(200);
  });

  test('is refused by the database to whoever goes round the application', async () => {
    const scheme = await aSchemeWithRules();
    for (const statement of ["update scheme_rules set rules = '{}'", 'delete from scheme_rules']) {
      await expect(services().database.query(statement)).rejects.toThrow(/permission denied/);
    }
    expect(await versionsOf(scheme)).toEqual([1]);
  });
});
