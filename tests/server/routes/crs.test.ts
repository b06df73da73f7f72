import proj4 from 'proj4';
import request from 'supertest';
import { beforeAll, describe, expect, test } from 'vitest';
import type TestAgent from 'supertest/lib/agent.js';
import { crsListSchema, crsSchema, MOST_CRS } from '../../../shared/schemas/crs.ts';
import { aPerson } from '../../support/factories.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();
let agent: TestAgent;

beforeAll(async () => {
  agent = await signIn(app(), await aPerson());
});

async function found(search: string): Promise<number[]> {
  const answer = await agent.get('/api/crs').query({ search });
  expect(answer.status).toBe(200);
  return crsListSchema.parse(answer.body).map(({ code }) => code);
}

describe('searching systems', () => {
  test.each([
    ['32631', 32631],
    ['EPSG:32631', 32631],
    ['epsg 27700', 27700],
    ['british national grid', 27700],
    ['OSGB 36', 27700],
    ['United Kingdom', 27700],
    ['SWEDEN', 3006],
    ['reunion', 2975],
    ['Réunion', 2975],
    ['rd new', 28992],
    ['27700 british', 27700],
    ['Spain', 25829],
    ['Spain', 25831],
  ])('"%s" finds EPSG:%d', async (search, code) => {
    expect((await found(search)).slice(0, 6)).toContain(code);
  });

  test.each([
    ['27700 british', 27700],
    ['Spain', 25830],
    ['France', 2154],
    ['Sweden', 3006],
  ])('of "%s" the first is EPSG:%d', async (search, code) => {
    expect((await found(search))[0]).toBe(code);
  });

  test('finds a zone by its name', async () => {
    expect(await found('UTM zone 31N')).toContain(32631);
    expect((await found('wgs 84 utm 31n'))[0]).toBe(32631);
  });

  test('answers with a few, in metres, on axes east and north', async () => {
    for (const search of ['a', 'utm', '2', 'Germany']) {
      expect(await found(search)).toHaveLength(MOST_CRS);
    }
    expect(await found('California zone 1 (ftUS)')).toEqual([]);
    expect(await found('5513')).toEqual([]);
    expect(await found('4326')).toEqual([]);
  });

  test('leaves out maps of the world, on which lengths are wrong', async () => {
    expect(await found('3857')).toEqual([]);
    expect(await found('Pseudo-Mercator')).toEqual([]);
    expect(await found('World Mercator')).toEqual([]);
  });

  test('finds nothing for nothing, and nothing for nonsense', async () => {
    expect(await found('')).toEqual([]);
    expect(await found(' -- ')).toEqual([]);
    expect(await found('no such system')).toEqual([]);
  });

  test('refuses an endless search', async () => {
    expect((await agent.get('/api/crs').query({ search: 'a'.repeat(201) })).status).toBe(422);
  });

  test('is for people who are signed in', async () => {
    expect((await request(app()).get('/api/crs?search=utm')).status).toBe(401);
    expect((await request(app()).get('/api/crs/32631')).status).toBe(401);
  });
});

describe('searching systems of files', () => {
  async function foundForFile(search: string): Promise<number[]> {
    const answer = await agent.get('/api/crs').query({ search, for: 'file' });
    expect(answer.status).toBe(200);
    return crsListSchema.parse(answer.body).map(({ code }) => code);
  }

  test.each([
    ['4326', 4326],
    ['WGS 84', 4326],
    ['ETRS89', 4258],
    ['EPSG:2225', 2225],
    ['California zone 1 (ftUS)', 2225],
    ['british national grid', 27700],
    ['Pseudo-Mercator', 3857],
    ['WGS 84 / UTM zone 31N', 32631],
  ])('"%s" finds EPSG:%d', async (search, code) => {
    expect((await foundForFile(search)).slice(0, 6)).toContain(code);
  });

  test('leaves out those that nothing can be placed by', async () => {
    expect(await foundForFile('5513')).toEqual([]);
    expect(await foundForFile('NTF (Paris)')).not.toContain(4807);
  });

  test('takes no other purpose', async () => {
    const answer = await agent.get('/api/crs').query({ search: 'utm', for: 'tunnels' });
    expect(answer.status).toBe(422);
  });
});

describe('one system', () => {
  test.each([
    [4326, 'World.'],
    [2225, 'United States (USA)'],
  ])('EPSG:%d can be a file’s', async (code, area) => {
    const answer = await agent.get(`/api/crs/${code}?for=file`);
    expect(answer.status).toBe(200);
    expect(crsSchema.parse(answer.body).area).toContain(area);
    expect((await agent.get(`/api/crs/${code}`)).status).toBe(422);
  });

  async function definitionOf(code: number): Promise<string> {
    const answer = await agent.get(`/api/crs/${code}`);
    expect(answer.status).toBe(200);
    return crsSchema.parse(answer.body).definition;
  }

  test('comes with its definition for proj4 and its bounds', async () => {
    const answer = await agent.get('/api/crs/32631');
    const { name, bounds, definition } = crsSchema.parse(answer.body);
    expect([name, bounds]).toEqual(['WGS 84 / UTM zone 31N', [0, 0, 6, 84]]);
    // the central meridian is 500 km east at any latitude; 0.9996 is the scale on it
    const [east, north] = proj4(definition).forward([3, 54.86]);
    expect(east).toBeCloseTo(500_000, 6);
    expect(north).toBeGreaterThan(6_079_000);
    expect(north).toBeLessThan(6_080_000);
  });

  test('lies on the map within some metres where its grid of shifts has a stand-in', async () => {
    // Caister water tower, of the Ordnance Survey's guide to coordinate systems in Great Britain
    const tower: [number, number] = [1 + 42 / 60 + 57.8663 / 3600, 52 + 39 / 60 + 28.8282 / 3600];
    const [east, north] = proj4(await definitionOf(27700)).forward(tower);
    expect(Math.hypot(east - 651_409.792, north - 313_177.448)).toBeLessThan(5);
  });

  test('is refused in words where it is no projected system in metres', async () => {
    const answer = await agent.get('/api/crs/4326');
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({
      error: {
        message:
          'EPSG:4326 (WGS 84) is not a projected system. Choose one with eastings and northings in metres.',
      },
    });
  });

  test('is refused in words where its lengths are not those on the ground', async () => {
    const answer = await agent.get('/api/crs/3857');
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({
      error: {
        message:
          'Lengths on EPSG:3857 (WGS 84 / Pseudo-Mercator) are not those on the ground: 100 m can be 1,144 m. Choose a national grid or a UTM zone.',
      },
    });
  });

  test.each(['9999', '102001', 'utm', '..%2F..%2Fpackage'])('is not there as %s', async (code) => {
    expect((await agent.get(`/api/crs/${code}`)).status).toBe(404);
  });
});
