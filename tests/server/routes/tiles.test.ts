import request from 'supertest';
import { beforeAll, describe, expect, test } from 'vitest';
import type { Building } from '../../../server/models/building.ts';
import { BackgroundFeature } from '../../../server/models/background-feature.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aBuilding, aMember, aScheme } from '../../support/factories.ts';
import { readTile } from '../../support/read-tile.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();
const CORNERS = { west: 3.0005, south: 54.9005, east: 3.001, north: 54.901 };

/** The tile that holds the middle of the corners, by the formula of web maps. */
function placeAt(z: number): string {
  const [longitude, latitude] = [3.00075, (54.90075 * Math.PI) / 180];
  const x = (longitude + 180) / 360;
  const y = (1 - Math.asinh(Math.tan(latitude)) / Math.PI) / 2;
  return [z, Math.floor(x * 2 ** z), Math.floor(y * 2 ** z)].join('/');
}

let scheme: Scheme;
let building: Building;

function ringOf({ west, south, east, north }: typeof CORNERS): [number, number][] {
  return [[west, south], [east, south], [east, north], [west, north], [west, south]]; // prettier-ignore
}

function buildingsAt(version: number, place = placeAt(14), of = scheme): string {
  return `/api/schemes/${of.id}/tiles/buildings/${version}/${place}.pbf`;
}

function backgroundAt(version: number, place = placeAt(14), of = scheme): string {
  return `/api/schemes/${of.id}/tiles/background/${version}/${place}.pbf`;
}

async function asWitness(of = scheme) {
  return signIn(app(), await aMember(of, 'witness'));
}

beforeAll(async () => {
  scheme = await aScheme();
  building = await aBuilding(scheme, {
    reference: 'PD-1',
    name: 'Custom House',
    lonLat: [[ringOf(CORNERS)]],
    ...CORNERS,
  });
  await BackgroundFeature.create({
    schemeId: scheme.id,
    layer: 'parks',
    name: 'Green',
    geometry: { type: 'Polygon', coordinates: [ringOf(CORNERS)] },
    ...CORNERS,
  });
  await BackgroundFeature.create({
    schemeId: scheme.id,
    layer: 'streets',
    name: null,
    geometry: { type: 'LineString', coordinates: ringOf(CORNERS).slice(0, 3) },
    ...CORNERS,
  });
});

describe('tiles of buildings', () => {
  test('hold the buildings that reach into them, by number', async () => {
    const answer = await (await asWitness()).get(buildingsAt(1)).responseType('blob');
    expect(answer.status).toBe(200);
    expect(answer.headers['content-type']).toBe('application/vnd.mapbox-vector-tile');
    expect(answer.headers['cache-control']).toBe('private, max-age=31536000, immutable');
    const properties = { reference: 'PD-1', name: 'Custom House' };
    expect(readTile(answer.body)).toEqual({
      buildings: [{ id: building.id, type: 3, properties }],
    });
  });

  test('are found at every zoom from 13 to 17', async () => {
    const agent = await asWitness();
    for (let z = 13; z <= 17; z += 1) {
      const answer = await agent.get(buildingsAt(1, placeAt(z))).responseType('blob');
      expect(readTile(answer.body).buildings).toHaveLength(1);
    }
  });

  test('say from close by where to write, on each building once', async () => {
    const own = await aScheme();
    const agent = await asWitness(own);
    const at = { lonLat: [[ringOf(CORNERS)]], ...CORNERS };
    await aBuilding(own, { ...at, reference: 'PD-2' });
    await aBuilding(own, { ...at, reference: 'PD-3', name: 'Net Loft' });
    for (const [z, references] of [
      [15, []],
      [16, ['PD-2', 'PD-3']],
    ] as const) {
      const answer = await agent.get(buildingsAt(1, placeAt(z), own)).responseType('blob');
      const { labels = [] } = readTile(answer.body);
      expect(labels.map(({ type }) => type)).toEqual(references.map(() => 1));
      expect(labels.map(({ properties }) => properties.reference)).toEqual(references);
    }
  });

  test('are empty where nothing stands, and where only others’ buildings do', async () => {
    const other = await aScheme();
    const agent = await asWitness(other);
    const answer = await agent.get(buildingsAt(1, placeAt(14), other));
    expect(answer.status).toBe(204);
    expect(answer.headers['cache-control']).toContain('immutable');
    expect((await (await asWitness()).get(buildingsAt(1, '14/0/0'))).status).toBe(204);
  });

  test('lead from another version to the newest', async () => {
    const agent = await asWitness();
    for (const version of [0, 2, 7]) {
      const answer = await agent.get(buildingsAt(version)).redirects(0);
      expect(answer.status).toBe(307);
      expect(answer.headers).toMatchObject({
        location: buildingsAt(1),
        'cache-control': 'no-store',
      });
    }
  });

  test('are kept until the version moves on', async () => {
    const own = await aScheme();
    const agent = await asWitness(own);
    const place = placeAt(14);
    expect((await agent.get(buildingsAt(1, place, own))).status).toBe(204);
    await aBuilding(own, { lonLat: [[ringOf(CORNERS)]], ...CORNERS });
    expect((await agent.get(buildingsAt(1, place, own))).status).toBe(204);
    await own.update({ registerVersion: 2 });
    expect((await agent.get(buildingsAt(2, place, own))).status).toBe(200);
  });

  test.each(['12/4164/2599', '18/0/0', '14/16384/0', '14/0/-1', '14/0.5/0', 'x/0/0'])(
    'are not there at %s',
    async (place) => {
      expect((await (await asWitness()).get(buildingsAt(1, place))).status).toBe(404);
    },
  );

  test('are not for owners, strangers or nobody', async () => {
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    expect((await owner.get(buildingsAt(1))).status).toBe(403);
    const stranger = await asWitness(await aScheme());
    for (const version of [1, 2]) {
      expect((await stranger.get(buildingsAt(version))).status).toBe(404);
    }
    expect((await request(app()).get(buildingsAt(1))).status).toBe(401);
  });
});

describe('tiles of the background', () => {
  test('hold its layers', async () => {
    const answer = await (await asWitness()).get(backgroundAt(1)).responseType('blob');
    expect(readTile(answer.body)).toEqual({
      streets: [{ id: undefined, type: 2, properties: {} }],
      parks: [{ id: undefined, type: 3, properties: { name: 'Green' } }],
    });
  });

  test('are for owners too, and lead from another version to the newest', async () => {
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    expect((await owner.get(backgroundAt(1))).status).toBe(200);
    const answer = await owner.get(backgroundAt(9)).redirects(0);
    expect(answer.headers.location).toBe(backgroundAt(1));
  });

  test('leave away far out what cannot be seen', async () => {
    const agent = await asWitness();
    expect((await agent.get(backgroundAt(1, placeAt(10)))).status).toBe(204);
    expect((await agent.get(backgroundAt(1, placeAt(9)))).status).toBe(404);
  });

  test('are not for strangers or nobody', async () => {
    const stranger = await asWitness(await aScheme());
    expect((await stranger.get(backgroundAt(1))).status).toBe(404);
    expect((await request(app()).get(backgroundAt(1))).status).toBe(401);
  });
});
