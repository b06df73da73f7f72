import { beforeAll, expect, test } from 'vitest';
import { auditPageSchema } from '../../../shared/schemas/audit.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Person } from '../../../server/models/person.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();
const ENTRIES = 60;
let administrator: Person;
let scheme: Scheme;

beforeAll(async () => {
  administrator = await anAdministrator();
  scheme = await aScheme({ name: 'Port Dogger' });
  for (let k = 0; k < ENTRIES; k += 1) {
    const [before, after]: object[] = [{ value: k - 1 }, { value: k }];
    await AuditEntry.create({
      personId: k % 2 === 0 ? administrator.id : null,
      schemeId: k % 2 === 0 ? scheme.id : null,
      action: `change ${k}`,
      subjectKind: 'scheme',
      subjectId: scheme.id,
      before: before ?? null,
      after: after ?? null,
    });
  }
});

async function page(query: string) {
  const agent = await signIn(app(), administrator);
  const answer = await agent.get(`/api/audit${query}`);
  expect(answer.status).toBe(200);
  return auditPageSchema.parse(answer.body);
}

test('the newest come first, with who, where, from what to what', async () => {
  const { entries } = await page('');
  expect(entries).toHaveLength(50);
  expect(entries[0]).toMatchObject({ action: 'change 59', person: null, scheme: null });
  expect(entries[1]).toMatchObject({
    action: 'change 58',
    person: { id: administrator.id, email: administrator.email },
    scheme: { id: scheme.id, name: 'Port Dogger' },
    subject: { kind: 'scheme', id: scheme.id },
    before: { value: 57 },
    after: { value: 58 },
  });
});

test('pages follow each other without gap or repetition', async () => {
  const first = await page('');
  const second = await page(`?before=${first.next ?? ''}`);
  expect(second.next).toBeNull();
  const actions = [...first.entries, ...second.entries].map(({ action }) => action);
  expect(actions).toEqual(Array.from({ length: ENTRIES }, (_, k) => `change ${ENTRIES - 1 - k}`));
});

test('a full last page is the last', async () => {
  const { entries } = await page('');
  const { next } = await page(`?before=${entries.at(9)?.id ?? ''}`);
  expect(next).toBeNull();
});

test('one scheme can be read alone', async () => {
  const { entries, next } = await page(`?schemeId=${scheme.id}`);
  expect(entries).toHaveLength(ENTRIES / 2);
  expect(entries.every((entry) => entry.scheme?.id === scheme.id)).toBe(true);
  expect(next).toBeNull();
});

test('a scheme that is not there has no entries', async () => {
  const { entries } = await page('?schemeId=3fa85f64-5717-4562-b3fc-2c963f66afa6');
  expect(entries).toEqual([]);
});

test.each(['before=x', 'before=1;drop', 'before=9999999999999999999', 'schemeId=x', 'page=2'])(
  'does not take ?%s',
  async (query) => {
    const agent = await signIn(app(), administrator);
    const answer = await agent.get(`/api/audit?${query}`);
    expect(answer.status).toBe(422);
  },
);

test('asks for a person', async () => {
  expect((await (await visitor(app())).get('/api/audit')).status).toBe(401);
});

test('is the administrator’s, also of a scheme that one has a part in', async () => {
  const person = await aMember(scheme, 'designer', 'assessor', 'owner', 'witness');
  const agent = await signIn(app(), person);
  for (const path of ['/api/audit', `/api/audit?schemeId=${scheme.id}`]) {
    const answer = await agent.get(path);
    expect(answer.status).toBe(403);
    expect(answer.text).not.toContain('change');
  }
});
