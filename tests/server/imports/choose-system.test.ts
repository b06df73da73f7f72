import { describe, expect, test } from 'vitest';
import { aMember, aScheme } from '../../support/factories.ts';
import { CORNER, feature, geojson, houses, rectangle } from '../../support/import-files.ts';
import { importSession } from '../../support/import-session.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app, services } = testApp();

type Point = [number, number];

async function begin(crs: number) {
  const scheme = await aScheme({ crs });
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  return importSession(agent, scheme, services());
}

/** A house at some place. */
function at([x, y]: Point, isTurned = false): Point[] {
  return rectangle(0, 0).map(([east, north]): Point => {
    const [one, other] = [east - CORNER[0] + x, north - CORNER[1] + y];
    return isTurned ? [other, one] : [one, other];
  });
}

function file(rings: readonly Point[][], crs: number | null = null): string {
  return geojson(rings.map((ring, index) => feature({ ref: `A${index}` }, ring)), crs); // prettier-ignore
}

const BOTH = 'Both orders of the axes are possible: look at the map before you bring them in.';

describe('a system that the person names', () => {
  test('brings the order of axes that fits it', async () => {
    const session = await begin(32631);
    const asked = await session.send(file([at([500_000, 6_080_000], true)]));
    expect(asked.options.place).toMatchObject({ crs: null, exchangeAxes: false });
    const chosen = await session.choose(asked, { place: { ...asked.options.place, crs: 32631 } });
    expect(chosen.options.place).toMatchObject({ crs: 32631, exchangeAxes: true });
    expect(chosen.place?.words).toContain('northing first: its axes were exchanged');
    expect(chosen.counts).toMatchObject({ new: 1, refused: 0 });
    const back = await session.choose(chosen, { place: { ...chosen.options.place, crs: 25831 } });
    expect(back.options.place).toMatchObject({ crs: 25831, exchangeAxes: true });
  });

  test('leaves the order that the person chose', async () => {
    const session = await begin(32631);
    const asked = await session.send(file([at([500_000, 6_080_000])]));
    const own = await session.choose(asked, { place: { ...asked.options.place, exchangeAxes: true } }); // prettier-ignore
    const chosen = await session.choose(own, { place: { ...own.options.place, crs: 32631 } });
    expect(chosen.options.place).toMatchObject({ crs: 32631, exchangeAxes: true });
    expect(chosen.place?.words).toContain('Its axes are exchanged.');
    expect(chosen.counts).toMatchObject({ refused: 1 });
  });
});

describe('where both orders of axes are possible', () => {
  test.each([
    [27700, [530_000, 180_000]],
    [3035, [4_321_000, 3_210_000]],
  ] as const)('EPSG:%i says so in an empty scheme', async (crs, [x, y]) => {
    const session = await begin(crs);
    const row = await session.send(file([at([x, y])], crs));
    expect(row.options.place.exchangeAxes).toBe(false);
    expect(row.place?.words).toContain(BOTH);
  });

  test('what the scheme holds decides', async () => {
    const session = await begin(27700);
    await session.confirm(await session.send(file([at([530_000, 180_000])], 27700)));
    const [plain, turned] = [
      await session.send(file([at([530_100, 180_000])], 27700)),
      await session.send(file([at([530_100, 180_000], true)], 27700)),
    ];
    expect(plain.options.place.exchangeAxes).toBe(false);
    expect(plain.place?.words).not.toContain(BOTH);
    expect(turned.options.place.exchangeAxes).toBe(true);
  });
});

describe('words on what does not fit', () => {
  test('longitude and latitude read in metres', async () => {
    const session = await begin(32631);
    const small: Point[] = [[3, 54.86], [3.0001, 54.86], [3.0001, 54.8601], [3, 54.86]]; // prettier-ignore
    const large: Point[] = [[3, 54.86], [3.004, 54.86], [3.004, 54.864], [3, 54.86]]; // prettier-ignore
    const row = await session.send(file([small, large], 32631));
    expect((await session.rows(row)).map(({ remarks }) => remarks)).toEqual(
      Array(2).fill(['These look like longitude and latitude: choose a system in degrees.']),
    );
  });

  test.each([
    [1, 'Half of the file lies outside'],
    [2, 'Most of the file lies outside'],
  ])('%i of the file outside beside one inside', async (count, words) => {
    const session = await begin(32631);
    const away = Array.from({ length: count }, (_, k) => at([2_400_000, 6_080_000 + 50 * k]));
    const row = await session.send(file([at([500_000, 6_080_000]), ...away], 32631));
    expect(row.place?.words).toContain(words);
  });

  test('a building on both sides of the date line', async () => {
    const session = await begin(32660);
    const ring: Point[] = [[179.9999, 60], [-179.9999, 60], [-179.9999, 60.0001], [179.9999, 60.0001], [179.9999, 60]]; // prettier-ignore
    const row = await session.send(file([ring], 4326));
    const [across] = await session.rows(row);
    expect(across?.outcome).toBe('refused');
    expect(across?.remarks.join(' ')).toContain('lies across 180° of longitude');
  });

  test('points in a table of values', async () => {
    const session = await begin(32631);
    const row = await session.send('ref,x,y,name\nA1,500000,6080000,Mill\n', 'points.csv');
    const [point] = await session.rows(row);
    expect(point?.remarks.join(' ')).toContain('Its X and Y are a point, which is no footprint.');
  });
});

test('the same town from a format that rounds is the same', async () => {
  const session = await begin(32631);
  await session.confirm(await session.send(geojson(houses(3))));
  const rounded = houses(3).map((one) =>
    JSON.parse(JSON.stringify(one).replaceAll(/(\d{6,7})([,\]])/g, '$1.0006$2')) as object,
  ); // prettier-ignore
  const row = await session.send(geojson(rounded));
  expect(row.counts).toMatchObject({ same: 3, changed: 0, conflict: 0 });
});
