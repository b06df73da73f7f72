import { beforeAll, describe, expect, test } from 'vitest';
import { memberSchema, membersSchema } from '../../../shared/schemas/members.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Membership } from '../../../server/models/membership.ts';
import type { Person } from '../../../server/models/person.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import {
  aMember,
  aMembership,
  anAdministrator,
  aPerson,
  aScheme,
} from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const { app } = testApp();
let administrator: Person;

beforeAll(async () => {
  administrator = await anAdministrator();
});

function asAdministrator() {
  return signIn(app(), administrator);
}

async function rolesOf(scheme: Scheme, person: Person): Promise<string[]> {
  const where = { schemeId: scheme.id, personId: person.id };
  return (await Membership.findAll({ where })).map(({ role }) => role).sort();
}

function addressOf(scheme: Scheme, person: Person): string {
  return `/api/schemes/${scheme.id}/members/${person.id}`;
}

describe('reading members', () => {
  test('shows everybody with their roles, by name', async () => {
    const scheme = await aScheme();
    const invited = await aPerson({ name: 'Älva', password: null });
    const named = await aPerson({ name: 'Zoe' });
    await aMembership(scheme, named, 'owner');
    await aMembership(scheme, invited, 'witness', 'assessor');
    await aMember(await aScheme(), 'designer');
    const answer = await (await asAdministrator()).get(`/api/schemes/${scheme.id}/members`);
    expect(answer.status).toBe(200);
    const { id, name, email } = invited;
    expect(membersSchema.parse(answer.body)).toEqual([
      { person: { id, name, email }, roles: ['assessor', 'witness'], accepted: false },
      {
        person: { id: named.id, name: 'Zoe', email: named.email },
        roles: ['owner'],
        accepted: true,
      },
    ]);
    expect(answer.text).not.toContain('argon2');
  });

  test('is for the administrator', async () => {
    const scheme = await aScheme();
    const address = `/api/schemes/${scheme.id}/members`;
    const member = await signIn(app(), await aMember(scheme, 'designer', 'assessor', 'witness'));
    expect((await member.get(address)).status).toBe(403);
    const stranger = await signIn(app(), await aMember(await aScheme(), 'designer'));
    expect((await stranger.get(address)).status).toBe(404);
    expect((await (await visitor(app())).get(address)).status).toBe(401);
  });
});

describe('changing the roles of a person', () => {
  test('replaces them, and tells the trail from what to what', async () => {
    const scheme = await aScheme();
    const other = await aScheme();
    const person = await aMember(scheme, 'designer', 'witness');
    await aMembership(other, person, 'owner');
    const agent = await asAdministrator();
    const answer = await agent
      .put(addressOf(scheme, person))
      .send({ roles: ['witness', 'assessor'] });
    expect(answer.status).toBe(200);
    expect(memberSchema.parse(answer.body).roles).toEqual(['assessor', 'witness']);
    expect(await rolesOf(scheme, person)).toEqual(['assessor', 'witness']);
    expect(await rolesOf(other, person)).toEqual(['owner']);
    expect(await AuditEntry.findAll({ where: { subjectId: person.id } })).toMatchObject([
      {
        action: 'change roles',
        personId: administrator.id,
        schemeId: scheme.id,
        before: { roles: ['designer', 'witness'] },
        after: { roles: ['assessor', 'witness'] },
      },
    ]);
  });

  test('brings somebody in, and takes them out again at once', async () => {
    const scheme = await aScheme();
    const person = await aPerson();
    const agent = await asAdministrator();
    await agent.put(addressOf(scheme, person)).send({ roles: ['owner'] });
    const their = await signIn(app(), person);
    expect((await their.get(`/api/schemes/${scheme.id}`)).status).toBe(200);
    await agent.put(addressOf(scheme, person)).send({ roles: [] });
    expect(await rolesOf(scheme, person)).toEqual([]);
    expect((await their.get(`/api/schemes/${scheme.id}`)).status).toBe(404);
  });

  test('tells the trail nothing where nothing changes', async () => {
    const scheme = await aScheme();
    const person = await aMember(scheme, 'owner');
    await (await asAdministrator()).put(addressOf(scheme, person)).send({ roles: ['owner'] });
    expect(await AuditEntry.count({ where: { subjectId: person.id } })).toBe(0);
  });

  test.each([
    ['an unknown role', { roles: ['emperor'] }],
    ['a role twice', { roles: ['owner', 'owner'] }],
    ['no list', {}],
  ])('refuses %s', async (_, body) => {
    const scheme = await aScheme();
    const person = await aMember(scheme, 'owner');
    const answer = await (await asAdministrator()).put(addressOf(scheme, person)).send(body);
    expect(answer.status).toBe(422);
    expect(await rolesOf(scheme, person)).toEqual(['owner']);
  });

  test('finds nobody under an unknown id', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    for (const id of [UNKNOWN_ID, 'not-an-id']) {
      const answer = await agent
        .put(`/api/schemes/${scheme.id}/members/${id}`)
        .send({ roles: ['owner'] });
      expect(answer.status).toBe(404);
    }
    expect(await Membership.count({ where: { schemeId: scheme.id } })).toBe(0);
  });

  test('is refused in an archived scheme', async () => {
    const scheme = await aScheme({ archivedAt: new Date() });
    const person = await aMember(scheme, 'owner');
    const agent = await asAdministrator();
    const answer = await agent.put(addressOf(scheme, person)).send({ roles: [] });
    expect(answer.body).toMatchObject({ error: { code: 'archived' } });
    expect(await rolesOf(scheme, person)).toEqual(['owner']);
  });

  test('is for the administrator: nobody gives roles to themselves', async () => {
    const scheme = await aScheme();
    const member = await aMember(scheme, 'designer');
    const agent = await signIn(app(), member);
    const answer = await agent.put(addressOf(scheme, member)).send({ roles: ['assessor'] });
    expect(answer.status).toBe(403);
    const elsewhere = await agent
      .put(addressOf(await aScheme(), member))
      .send({ roles: ['owner'] });
    expect(elsewhere.status).toBe(404);
    const nobody = await visitor(app());
    const unsigned = await nobody.put(addressOf(scheme, member)).send({ roles: ['owner'] });
    expect(unsigned.status).toBe(401);
    expect(await rolesOf(scheme, member)).toEqual(['designer']);
  });
});
