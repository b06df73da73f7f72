import request from 'supertest';
import { describe, expect, test } from 'vitest';
import {
  buildingSchema,
  buildingsFoundSchema,
  extentSchema,
  MOST_BUILDINGS_FOUND,
} from '../../../shared/schemas/buildings.ts';
import { BackgroundFeature } from '../../../server/models/background-feature.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aBuilding, aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_NUMBER } from '../../support/unknown-ids.ts';

const { app } = testApp();

async function asAssessor(scheme: Scheme) {
  return signIn(app(), await aMember(scheme, 'assessor'));
}

/** The references that a search finds, the best first. */
async function found(scheme: Scheme, search: string, limit?: number): Promise<string[]> {
  const agent = await asAssessor(scheme);
  const query = limit === undefined ? { search } : { search, limit };
  const answer = await agent.get(`/api/schemes/${scheme.id}/buildings`).query(query);
  expect(answer.status).toBe(200);
  return buildingsFoundSchema.parse(answer.body).map(({ reference }) => reference);
}

async function aTown(): Promise<Scheme> {
  const scheme = await aScheme();
  await aBuilding(scheme, {
    reference: 'PD-0007',
    name: 'Customs House',
    address: '1 Quay Street',
  });
  await aBuilding(scheme, { reference: 'PD-0070', address: '12 Quay Street' });
  await aBuilding(scheme, { reference: 'PD-0071', name: 'Café Łódź', address: '2 Fish Lane' });
  await aBuilding(scheme, { reference: '0007', name: "St. Olav's Church" });
  await aBuilding(await aScheme(), { reference: 'PD-0008', name: 'Customs House' });
  return scheme;
}

describe('searching buildings', () => {
  test('finds by reference, name and address, by the beginnings of words', async () => {
    const scheme = await aTown();
    expect(await found(scheme, 'customs')).toEqual(['PD-0007']);
    expect(await found(scheme, 'HOUSE cust')).toEqual(['PD-0007']);
    expect(await found(scheme, 'quay')).toEqual(['PD-0007', 'PD-0070']);
    expect(await found(scheme, '12 quay st')).toEqual(['PD-0070']);
    expect(await found(scheme, 'pd-007')).toEqual(['PD-0070', 'PD-0071']);
    expect(await found(scheme, 'cafe lodz')).toEqual([]);
    expect(await found(scheme, 'CAFÉ łódź')).toEqual(['PD-0071']);
    expect(await found(scheme, 'cafe')).toEqual(['PD-0071']);
    expect(await found(scheme, 'olav')).toEqual(['0007']);
    expect(await found(scheme, 'ouse')).toEqual([]);
  });

  test('puts the reference that was typed first', async () => {
    const scheme = await aTown();
    expect(await found(scheme, '0007')).toEqual(['0007', 'PD-0007']);
    expect(await found(scheme, 'PD-0007')).toEqual(['PD-0007']);
  });

  test('takes any letters as they are', async () => {
    const scheme = await aTown();
    for (const search of ["'", ":* | !'", '%', '_', '\\', 'a & b', '<->', '']) {
      expect(await found(scheme, search)).toEqual([]);
    }
  });

  test('answers with a few', async () => {
    const scheme = await aScheme();
    for (let k = 0; k < 25; k += 1) await aBuilding(scheme, { reference: `R-${100 + k}` });
    expect(await found(scheme, 'r')).toHaveLength(MOST_BUILDINGS_FOUND);
    expect(await found(scheme, 'r', 3)).toEqual(['R-100', 'R-101', 'R-102']);
    const agent = await asAssessor(scheme);
    const address = `/api/schemes/${scheme.id}/buildings`;
    expect((await agent.get(`${address}?search=r&limit=1000`)).status).toBe(422);
    expect((await agent.get(`${address}?search=${'r'.repeat(201)}`)).status).toBe(422);
    expect((await agent.get(`${address}?search=%00`)).status).toBe(422);
  });

  test('says where each is', async () => {
    const scheme = await aScheme();
    const building = await aBuilding(scheme, { name: 'Lighthouse' });
    const agent = await asAssessor(scheme);
    const answer = await agent.get(`/api/schemes/${scheme.id}/buildings?search=light`);
    const [one] = buildingsFoundSchema.parse(answer.body);
    expect(one).toMatchObject({ id: building.id, name: 'Lighthouse', address: null });
    expect(one?.centre[0]).toBeCloseTo((building.west + building.east) / 2, 9);
    expect(one?.centre[1]).toBeCloseTo((building.south + building.north) / 2, 9);
  });
});

describe('one building', () => {
  test('is shown with what is known of it and its footprint in the grid', async () => {
    const scheme = await aScheme();
    const building = await aBuilding(scheme, { name: 'Lighthouse' });
    const agent = await asAssessor(scheme);
    const answer = await agent.get(`/api/schemes/${scheme.id}/buildings/${building.id}`);
    expect(answer.status).toBe(200);
    expect(buildingSchema.parse(answer.body)).toMatchObject({
      id: building.id,
      reference: building.reference,
      name: 'Lighthouse',
      storeys: null,
      area: 100,
      assumed: ['storeys', 'eavesHeight', 'foundingDepth', 'eOverG', 'poisson'],
      version: 1,
      bounds: [building.west, building.south, building.east, building.north],
    });
  });

  test('of another scheme answers like one that is not there', async () => {
    const scheme = await aScheme();
    const foreign = await aBuilding(await aScheme());
    const agent = await asAssessor(scheme);
    const address = `/api/schemes/${scheme.id}/buildings`;
    const unknown = await agent.get(`${address}/${UNKNOWN_NUMBER}`);
    expect(unknown.status).toBe(404);
    for (const id of [foreign.id, 'x', '1.5', '-1', '99999999999999999999']) {
      const answer = await agent.get(`${address}/${id}`);
      expect([answer.status, answer.text]).toEqual([404, unknown.text]);
    }
  });
});

describe('the extent of a scheme', () => {
  async function extentOf(scheme: Scheme) {
    const agent = await asAssessor(scheme);
    const answer = await agent.get(`/api/schemes/${scheme.id}/extent`);
    expect(answer.status).toBe(200);
    return extentSchema.parse(answer.body);
  }

  test('is round its buildings', async () => {
    const scheme = await aScheme();
    await aBuilding(scheme, { west: 3.1, south: 54.1, east: 3.2, north: 54.2 });
    await aBuilding(scheme, { west: 3.0, south: 54.15, east: 3.15, north: 54.3 });
    const bounds = [3.0, 54.1, 3.2, 54.3];
    expect(await extentOf(scheme)).toMatchObject({ bounds, crs: 32631, from: 'buildings' });
  });

  test('has a home that leaves out what lies far from nearly all', async () => {
    const scheme = await aScheme();
    const near = { west: 3, south: 54, east: 3.01, north: 54.01 };
    for (let k = 0; k < 50; k += 1) await aBuilding(scheme, near);
    expect(await extentOf(scheme)).toMatchObject({ home: [3, 54, 3.01, 54.01] });
    await aBuilding(scheme, { west: 3.5, south: 54.5, east: 3.51, north: 54.51 });
    expect(await extentOf(scheme)).toMatchObject({
      bounds: [3, 54, 3.51, 54.51],
      home: [3, 54, 3.01, 54.01],
    });
  });

  test('has a home round the densest of several towns', async () => {
    const scheme = await aScheme();
    for (const [west, count] of [
      [3, 2],
      [3.4, 5],
      [3.8, 2],
    ] as const) {
      const house = { west, south: 54.5, east: west + 0.001, north: 54.501 };
      for (let k = 0; k < count; k += 1) await aBuilding(scheme, house);
    }
    const { home } = await extentOf(scheme);
    const [west, south, east, north] = home;
    expect([(west + east) / 2, (south + north) / 2].map((degrees) => degrees.toFixed(6))).toEqual([
      ...['3.400000', '54.500000'],
    ]);
    expect(north - south).toBeCloseTo(0.015, 9);
  });

  test('is round its background where there are none', async () => {
    const scheme = await aScheme();
    const [west, south, east, north] = [3, 54, 3.5, 54.5];
    await BackgroundFeature.create({
      schemeId: scheme.id,
      layer: 'parks',
      name: null,
      geometry: { type: 'Polygon', coordinates: [] },
      ...{ west, south, east, north },
    });
    const bounds = [west, south, east, north];
    expect(await extentOf(scheme)).toEqual({
      bounds,
      home: bounds,
      crs: 32631,
      from: 'background',
    });
  });

  test('is where its system is used before anything is there', async () => {
    const bounds = [0, 0, 6, 84];
    expect(await extentOf(await aScheme())).toEqual({
      bounds,
      home: bounds,
      crs: 32631,
      from: 'crs',
    });
  });
});

describe('the register', () => {
  test.each(['buildings', 'buildings/1', 'extent'])(
    'at %s is not for owners, strangers or nobody',
    async (end) => {
      const scheme = await aScheme();
      const address = `/api/schemes/${scheme.id}/${end}`;
      const owner = await signIn(app(), await aMember(scheme, 'owner'));
      expect((await owner.get(address)).status).toBe(403);
      expect((await (await asAssessor(await aScheme())).get(address)).status).toBe(404);
      expect((await request(app()).get(address)).status).toBe(401);
    },
  );

  test('is for the administrator, designers and witnesses too', async () => {
    const scheme = await aScheme();
    const members = [
      await anAdministrator(),
      await aMember(scheme, 'designer'),
      await aMember(scheme, 'witness'),
    ];
    for (const member of members) {
      const agent = await signIn(app(), member);
      expect((await agent.get(`/api/schemes/${scheme.id}/buildings?search=x`)).status).toBe(200);
    }
  });
});
