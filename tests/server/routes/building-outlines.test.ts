import request from 'supertest';
import { describe, expect, test } from 'vitest';
import {
  buildingOutlinesSchema,
  type BuildingOutline,
} from '../../../shared/schemas/building-outlines.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aBuilding, aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();

/** In UTM zone 31 this square is 3.0000 to 3.0031 east and 54.8670 to 54.8688 north. */
const BOX = { west: 500_000, south: 6_080_000, east: 500_200, north: 6_080_200 };
const INSIDE = { west: 3.001, south: 54.8674, east: 3.0012, north: 54.8675 };
const footprint = [[[[500_070, 6_080_040], [500_080, 6_080_040], [500_080, 6_080_050], [500_070, 6_080_040]]]] as const; // prettier-ignore

function addressOf(scheme: Scheme): string {
  return `/api/schemes/${scheme.id}/building-outlines`;
}

async function outlinesIn(scheme: Scheme, box: object): Promise<BuildingOutline[]> {
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  const answer = await agent.get(addressOf(scheme)).query(box);
  expect(answer.status).toBe(200);
  return buildingOutlinesSchema.parse(answer.body);
}

describe('outlines of buildings in a box', () => {
  test('are those that stand there, with their heights', async () => {
    const scheme = await aScheme();
    const known = await aBuilding(scheme, {
      ...INSIDE,
      footprint,
      name: 'Customs House',
      storeys: 3,
      eavesHeight: 9.5,
    });
    const unknown = await aBuilding(scheme, { ...INSIDE, west: 2.9, east: 3.0001 });
    await aBuilding(scheme, { ...INSIDE, west: 3.004, east: 3.005 });
    await aBuilding(scheme, { ...INSIDE, south: 54.87, north: 54.88 });
    await aBuilding(scheme, { ...INSIDE, removedAt: new Date() });
    await aBuilding(await aScheme(), INSIDE);
    const found = await outlinesIn(scheme, BOX);
    expect(found.map(({ id }) => id)).toEqual([known.id, unknown.id]);
    expect(found[0]).toEqual({
      id: known.id,
      reference: known.reference,
      name: 'Customs House',
      storeys: 3,
      eavesHeight: 9.5,
      footprint,
    });
    expect(found[1]).toMatchObject({ storeys: null, eavesHeight: null });
  });

  test('are none where the grid does not reach', async () => {
    const scheme = await aScheme();
    await aBuilding(scheme, INSIDE);
    const far = { west: 90_000_000, south: 90_000_000, east: 90_000_100, north: 90_000_100 };
    expect(await outlinesIn(scheme, far)).toEqual([]);
  });

  test.each([
    [{ ...BOX, east: 500_501 }, 'east'],
    [{ ...BOX, north: 6_080_000 }, 'north'],
    [{ ...BOX, west: 'far' }, 'west'],
    [{ ...BOX, south: undefined }, 'south'],
  ])('are refused of a box that makes no sense', async (box, field) => {
    const scheme = await aScheme();
    const agent = await signIn(app(), await aMember(scheme, 'assessor'));
    const answer = await agent.get(addressOf(scheme)).query(box);
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path: field }] } });
  });

  test('are for who reads the register, and for nobody else', async () => {
    const scheme = await aScheme();
    const administrator = await signIn(app(), await anAdministrator());
    expect((await administrator.get(addressOf(scheme)).query(BOX)).status).toBe(200);
    for (const role of ['designer', 'witness'] as const) {
      const member = await signIn(app(), await aMember(scheme, role));
      expect((await member.get(addressOf(scheme)).query(BOX)).status).toBe(200);
    }
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    expect((await owner.get(addressOf(scheme)).query(BOX)).status).toBe(403);
    const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
    expect((await stranger.get(addressOf(scheme)).query(BOX)).status).toBe(404);
    expect((await request(app()).get(addressOf(scheme)).query(BOX)).status).toBe(401);
  });
});
