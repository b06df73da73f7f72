import { beforeAll, describe, expect, test } from 'vitest';
import type TestAgent from 'supertest/lib/agent.js';
import { buildingHistorySchema } from '../../../shared/schemas/register-changes.ts';
import {
  visitedBuildingsSchema,
  visitSchema,
  visitsSchema,
} from '../../../shared/schemas/visits.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Building } from '../../../server/models/building.ts';
import type { Person } from '../../../server/models/person.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { VisitPhotograph } from '../../../server/models/visit-photograph.ts';
import { Visit } from '../../../server/models/visit.ts';
import { aBuilding, aMember, aScheme } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID, UNKNOWN_NUMBER } from '../../support/unknown-ids.ts';
import { aNewVisit, anAnnounced } from '../../support/visits.ts';

const { app } = testApp();
let scheme: Scheme;
let person: Person;
let assessor: TestAgent;

beforeAll(async () => {
  scheme = await aScheme();
  person = await aMember(scheme, 'assessor');
  assessor = await signIn(app(), person);
});

function at({ schemeId, id }: Pick<Building, 'schemeId' | 'id'>): string {
  return `/api/schemes/${schemeId}/buildings/${id}/visits`;
}

describe('recording a visit', () => {
  test('keeps it, says that the building was inspected, and leaves one line of its own', async () => {
    const building = await aBuilding(scheme, { condition: 'good' });
    const visit = aNewVisit({ photographs: [anAnnounced(), anAnnounced({ caption: '' })] });
    const answer = await assessor.post(at(building)).send(visit);
    expect([answer.status, answer.body]).toMatchObject([201, { by: person.name }]);
    const recorded = visitSchema.parse(answer.body);
    expect(recorded).toMatchObject({
      ...{ id: visit.id, buildingId: building.id, visitedAt: '2026-12-01T13:30:00.000Z' },
      ...{ part: 'outside', condition: 'fair', notes: visit.notes, defects: visit.defects },
    });
    expect(recorded.photographs.map(({ caption, hasArrived }) => [caption, hasArrived])).toEqual([
      ['The gable', false],
      ['', false],
    ]);
    const kept = await Visit.findByPk(visit.id, { rejectOnEmpty: true });
    expect(kept).toMatchObject({ visitedBy: person.id, schemeId: scheme.id });
    await building.reload();
    // the day on the phone, which is not the day in Greenwich
    expect(building).toMatchObject({ inspected: '2026-12-02, outside', condition: 'good', version: 2 }); // prettier-ignore
    const lines = await AuditEntry.findAll({ where: { subjectId: visit.id } });
    expect(lines).toMatchObject([
      { action: 'record visit', after: { defects: 1, photographs: 2 } },
    ]);
  });

  test('puts the register right in the same step, and the old value stays in the history', async () => {
    const building = await aBuilding(scheme, { condition: 'good', storeys: 2 });
    const changes = { version: 1, values: { condition: 'poor', storeys: 3 } };
    const answer = await assessor.post(at(building)).send(aNewVisit({ changes }));
    expect(answer.status).toBe(201);
    await building.reload();
    expect(building).toMatchObject({ condition: 'poor', storeys: 3, version: 2 });
    const path = `/api/schemes/${scheme.id}/buildings/${building.id}/history`;
    const [entry] = buildingHistorySchema.parse((await assessor.get(path)).body);
    expect(entry).toMatchObject({
      ...{ kind: 'visit', by: person.name, before: { condition: 'good', storeys: 2 } },
      after: { condition: 'poor', storeys: 3, inspected: '2026-12-02, outside' },
    });
  });

  test('sent again is recorded once; with other words it is refused', async () => {
    const building = await aBuilding(scheme);
    const visit = aNewVisit({ changes: { version: 1, values: { storeys: 4 } } });
    const both = await Promise.all([1, 2].map(() => assessor.post(at(building)).send(visit)));
    expect(both.map(({ status }) => status).sort()).toEqual([200, 201]);
    expect((await assessor.post(at(building)).send(visit)).status).toBe(200);
    const other = await assessor.post(at(building)).send({ ...visit, notes: 'Other words.' });
    expect([other.status, other.body]).toMatchObject([409, { error: { code: 'already-exists' } }]);
    const second = await signIn(app(), await aMember(scheme, 'assessor'));
    expect((await second.post(at(building)).send(visit)).status).toBe(409);
    expect(await Visit.count({ where: { buildingId: building.id } })).toBe(1);
    await building.reload();
    expect(building).toMatchObject({ storeys: 4, version: 2 });
    expect(await Visit.findByPk(visit.id)).toMatchObject({ notes: visit.notes });
  });

  test('on top of an older version of the building records nothing', async () => {
    const building = await aBuilding(scheme, { condition: 'good' });
    const path = `/api/schemes/${scheme.id}/buildings/${building.id}`;
    await assessor.patch(path).send({ version: 1, attributes: { condition: 'fair' } });
    const visit = aNewVisit({ changes: { version: 1, values: { condition: 'poor' } } });
    const late = await assessor.post(at(building)).send(visit);
    expect([late.status, late.body]).toMatchObject([409, { error: { code: 'conflict' } }]);
    expect(await Visit.findByPk(visit.id)).toBeNull();
    await building.reload();
    expect(building).toMatchObject({ condition: 'fair', inspected: null });
    const changes = { version: 2, values: { condition: 'poor' } };
    expect((await assessor.post(at(building)).send({ ...visit, changes })).status).toBe(201);
  });

  test('that comes late does not put the day of inspection back', async () => {
    const building = await aBuilding(scheme);
    await assessor.post(at(building)).send(aNewVisit());
    await assessor.post(at(building)).send(aNewVisit({ visitedAt: '2026-11-20T09:00:00Z' }));
    await building.reload();
    expect(building).toMatchObject({ inspected: '2026-12-02, outside', version: 2 });
    const visits = visitsSchema.parse((await assessor.get(at(building))).body);
    expect(visits.map(({ visitedAt }) => visitedAt.slice(0, 10))).toEqual(['2026-12-01', '2026-11-20']); // prettier-ignore
  });

  test('of a building that was taken out is kept, and puts nothing right', async () => {
    const building = await aBuilding(scheme, { removedAt: new Date() });
    expect((await assessor.post(at(building)).send(aNewVisit())).status).toBe(201);
    const changes = { version: 1, values: { storeys: 2 } };
    expect((await assessor.post(at(building)).send(aNewVisit({ changes }))).status).toBe(409);
  });

  const long = 'a'.repeat(301);
  test.each([
    ['a part that there is not', { part: 'from above' }, 'part'],
    ['a day that there is not', { visitedAt: '2026-02-30' }, 'visitedAt'],
    ['too long words', { condition: long }, 'condition'],
    ['a defect without a place', { defects: [{ place: ' ', kind: 'crack', width: 1, note: '' }] }, 'defects.0.place'], // prettier-ignore
    ['a width in metres', { defects: [{ place: 'a', kind: 'crack', width: 4000, note: '' }] }, 'defects.0.width'], // prettier-ignore
    ['too many defects', { defects: Array(101).fill({ place: 'a', kind: 'damp', width: null, note: '' }) }, 'defects'], // prettier-ignore
    ['too many photographs', { photographs: Array.from({ length: 61 }, () => anAnnounced()) }, 'photographs'], // prettier-ignore
    ['a place that nobody wanted kept', { photographs: [anAnnounced({ place: [1.6, 54.7] })] }, 'photographs.0.place'], // prettier-ignore
    ['a field that is not seen on a visit', { changes: { version: 1, values: { eOverG: 2 } } }, 'changes.values'], // prettier-ignore
    ['no change', { changes: { version: 1, values: {} } }, 'changes.values'],
  ])('refuses %s', async (_, wrong, path) => {
    const building = await aBuilding(scheme);
    const answer = await assessor.post(at(building)).send({ ...aNewVisit(), ...wrong });
    expect([answer.status, answer.body]).toMatchObject([422, { error: { fields: [{ path }] } }]);
    expect(await Visit.count({ where: { buildingId: building.id } })).toBe(0);
  });

  test('wants photographs of its own', async () => {
    const building = await aBuilding(scheme);
    const photograph = anAnnounced();
    await assessor.post(at(building)).send(aNewVisit({ photographs: [photograph] }));
    const other = aNewVisit({ photographs: [photograph] });
    expect((await assessor.post(at(building)).send(other)).status).toBe(409);
    expect(await Visit.findByPk(other.id)).toBeNull();
    expect(await VisitPhotograph.count({ where: { id: photograph.id } })).toBe(1);
  });

  test('is for assessors of the scheme', async () => {
    const building = await aBuilding(scheme);
    const visit = aNewVisit();
    for (const role of ['designer', 'witness', 'owner'] as const) {
      const agent = await signIn(app(), await aMember(scheme, role));
      expect((await agent.post(at(building)).send(visit)).status).toBe(403);
    }
    const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
    expect((await stranger.post(at(building)).send(visit)).status).toBe(404);
    expect((await (await visitor(app())).post(at(building)).send(visit)).status).toBe(401);
    const foreign = await aBuilding(await aScheme());
    const wrong = at({ schemeId: scheme.id, id: foreign.id });
    expect((await assessor.post(wrong).send(visit)).status).toBe(404);
    expect(await Visit.findByPk(visit.id)).toBeNull();
  });

  test('is refused in an archived scheme', async () => {
    const own = await aScheme();
    const agent = await signIn(app(), await aMember(own, 'assessor'));
    const building = await aBuilding(own);
    await own.update({ archivedAt: new Date() });
    const answer = await agent.post(at(building)).send(aNewVisit());
    expect(answer.body).toMatchObject({ error: { code: 'archived' } });
  });
});

describe('a visit', () => {
  test('cannot be changed by anybody', async () => {
    const building = await aBuilding(scheme);
    const visit = aNewVisit({ photographs: [anAnnounced()] });
    await assessor.post(at(building)).send(visit);
    const kept = await Visit.findByPk(visit.id, { rejectOnEmpty: true });
    await expect(kept.update({ notes: 'Other.' })).rejects.toThrow(/permission denied/);
    await expect(kept.destroy()).rejects.toThrow(/permission denied/);
  });
});

describe('the list of visited buildings', () => {
  test('tells how often, when and by whom, the newest first', async () => {
    const own = await aScheme();
    const agent = await signIn(app(), await aMember(own, 'assessor'));
    const [a, b] = [await aBuilding(own, { name: 'Mill' }), await aBuilding(own)];
    await aBuilding(own);
    await agent.post(at(a)).send(aNewVisit({ visitedAt: '2026-11-01T10:00:00Z' }));
    await agent.post(at(b)).send(aNewVisit({ visitedAt: '2026-11-02T10:00:00Z' }));
    await agent.post(at(a)).send(aNewVisit({ visitedAt: '2026-11-03T10:00:00Z', part: 'inside' }));
    const witness = await signIn(app(), await aMember(own, 'witness'));
    const answer = await witness.get(`/api/schemes/${own.id}/visits`);
    expect(visitedBuildingsSchema.parse(answer.body)).toMatchObject([
      { buildingId: a.id, name: 'Mill', visits: 2, part: 'inside', visitedAt: '2026-11-03T10:00:00.000Z' }, // prettier-ignore
      { buildingId: b.id, visits: 1, part: 'outside' },
    ]);
  });

  test('is not for owners, and of no other scheme', async () => {
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    expect((await owner.get(`/api/schemes/${scheme.id}/visits`)).status).toBe(403);
    expect((await assessor.get(`/api/schemes/${UNKNOWN_ID}/visits`)).status).toBe(404);
    const nowhere = at({ schemeId: scheme.id, id: UNKNOWN_NUMBER });
    expect((await assessor.get(nowhere)).status).toBe(404);
  });
});
