import { describe, expect, test } from 'vitest';
import { testApp } from '../../support/test-app.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { bowTie, CORNER, feature, geojson, houses, rectangle } from '../../support/import-files.ts';
import { importSession } from '../../support/import-session.ts';
import { signIn } from '../../support/sign-in.ts';

const { app, services } = testApp();

/** The rows of a file after its houses, checked. */
async function checked(more: readonly object[], crs = 32631) {
  const scheme = await aScheme();
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  const session = importSession(agent, scheme, services());
  const row = await session.send(geojson([...houses(30), ...more], crs));
  return (await session.rows(row)).slice(30);
}

const [EAST, NORTH] = CORNER;
const FAR = rectangle(0, 500).map(([x, y]): [number, number] => [x + 90_000, y]);
const AWAY = rectangle(0, 500).map(([x, y]): [number, number] => [x + 900_000, y]);
const EXCHANGED = rectangle(0, 500).map(([x, y]): [number, number] => [y, x]);
const HOLE = [rectangle(0, 500, 40, 40), rectangle(10, 510, 5, 5)];
const OUTSIDE = [rectangle(0, 500, 40, 40), rectangle(60, 510, 5, 5)];

function polygon(rings: unknown) {
  return { type: 'Polygon', coordinates: rings };
}

describe('a row', () => {
  test.each([
    ['without a footprint', null, 'It has no geometry.'],
    ['that crosses itself', bowTie(0, 500), 'The ring crosses itself near E 500 005, N 6 080 505. Have it mended'],
    ['without area', [[EAST, NORTH + 500], [EAST + 9, NORTH + 500.01], [EAST + 9, NORTH + 500], [EAST, NORTH + 500]], 'which is no building'],
    ['of a tenth of a square metre', rectangle(0, 500, 0.3, 0.3), 'which is no building'],
    ['too large', rectangle(0, 500, 600, 600), 'The footprint has an area of 360 000 m²'],
    ['of two corners', [[EAST, NORTH], [EAST + 5, NORTH], [EAST, NORTH], [EAST, NORTH]], 'fewer than three corners'],
    ['far from the rest', FAR, 'km from the rest of the file'],
    ['outside the area', AWAY, 'lies outside the area of'],
    ['with its axes exchanged', EXCHANGED, 'Easting and northing look exchanged'],
    ['there twice', rectangle(0, 0).map(([x, y]) => [x + 0.004, y]), 'The footprint is that of row 1.'],
    ['with a hole beside it', polygon(OUTSIDE), 'A hole lies outside'],
    ['with parts over each other', { type: 'MultiPolygon', coordinates: [[rectangle(0, 500, 40, 40)], [rectangle(10, 510, 5, 5)]] }, 'Its rings cross or lie over each other near'],
  ] as const)('%s is refused', async (_, geometry, remark) => {
    const drawn = geometry as Parameters<typeof feature>[1];
    const [row] = await checked([feature({ ref: 'odd' }, drawn)]);
    expect(row).toMatchObject({ outcome: 'refused', reference: 'odd' });
    expect(row?.remarks.join(' ')).toContain(remark);
  }); // prettier-ignore

  test.each([
    [{ ref: '  ' }, 'The reference is blank'],
    [{ ref: 'x'.repeat(61) }, 'longer than 60 letters'],
    [{ ref: 'H-7' }, 'The reference “H-7” stands in row 7 already'],
  ])('called %j is refused', async (properties, remark) => {
    const [row] = await checked([feature(properties, rectangle(0, 500))]);
    expect(row?.outcome).toBe('refused');
    expect(row?.remarks.join(' ')).toContain(remark);
  });

  test('is noted where a number cannot be read, and comes in', async () => {
    const [row] = await checked([feature({ ref: 'n', floors: 'some' }, rectangle(0, 500))]);
    expect(row).toMatchObject({ outcome: 'new', area: 80 });
    expect(row?.remarks).toEqual([
      'Storeys (column “floors”): “some” is no number. It is left as unknown, or as it was.',
    ]);
  });

  test('of half a square metre is noted', async () => {
    const [row] = await checked([feature({ ref: 'hut' }, rectangle(0, 500, 1, 0.5))]);
    expect(row).toMatchObject({ outcome: 'new', area: 0.5 });
    expect(row?.remarks).toEqual([
      'The footprint has an area of 0.5 m² only. Check whether it is a building.',
    ]);
  });

  test('that overlaps another is noted; a shared wall is not', async () => {
    const rows = await checked([
      feature({ ref: 'p' }, rectangle(0, 500)),
      feature({ ref: 'q' }, rectangle(10, 500)),
      feature({ ref: 'r' }, rectangle(5, 504, 10, 8)),
    ]);
    expect(rows.map(({ outcome }) => outcome)).toEqual(['new', 'new', 'new']);
    expect(rows.map(({ remarks }) => remarks)).toEqual([
      [],
      [],
      ['The footprint overlaps that of row 31 by 20 m².', 'The footprint overlaps that of row 32 by 20 m².'], // prettier-ignore
    ]);
  });

  test('keeps holes, parts and spikes right', async () => {
    const [first, second, third] = await checked([
      feature({ ref: 'hole' }, polygon(HOLE)),
      feature({ ref: 'parts' }, { type: 'MultiPolygon', coordinates: [[rectangle(0, 600)], [rectangle(50, 600)]] }), // prettier-ignore
      feature({ ref: 'spike' }, [...rectangle(100, 600).slice(0, 2), [EAST + 130, NORTH + 600], ...rectangle(100, 600).slice(1)]), // prettier-ignore
    ]);
    expect([first?.area, second?.area, third?.area]).toEqual([1575, 160, 80]);
    expect([first, second, third].map((row) => row?.outcome)).toEqual(['new', 'new', 'new']);
  });
});

describe('the order of axes', () => {
  function shuffled(features: readonly [number, number][][]) {
    return features.map((ring, index) => feature({ ref: `A${index}` }, ring));
  }

  test.each([
    [31256, 31256, [3_000, 340_000]],
    [3035, 31256, [4_795_000, 2_810_000]],
  ] as const)('of EPSG:%i in a scheme on EPSG:%i is told by the area', async (crs, own, corner) => {
    const scheme = await aScheme({ crs: own });
    const agent = await signIn(app(), await aMember(scheme, 'assessor'));
    const session = importSession(agent, scheme, services());
    const ring = rectangle(0, 0).map(([x, y]): [number, number] => [
      x - EAST + corner[0],
      y - NORTH + corner[1],
    ]);
    const turned = ring.map(([x, y]): [number, number] => [y, x]);
    const [plain, exchanged] = [
      await session.send(geojson(shuffled([ring]), crs)),
      await session.send(geojson(shuffled([turned]), crs)),
    ];
    expect(plain.options.place.exchangeAxes).toBe(false);
    expect(exchanged.options.place.exchangeAxes).toBe(true);
    expect(exchanged.place?.words).toContain('northing first');
    expect(exchanged.counts).toMatchObject({ new: 1, refused: 0 });
    expect(exchanged.bounds).toEqual(plain.bounds);
    const place = { ...exchanged.options.place, exchangeAxes: false };
    const flipped = await session.choose(exchanged, { place });
    expect(flipped.counts).toMatchObject({ new: 0, refused: 1 });
    const [row] = await session.rows(flipped);
    expect(row?.remarks.join(' ')).toMatch(
      /^Easting and northing look exchanged: only the other way/,
    );
  });

  test('of degrees is told by the area too', async () => {
    const scheme = await aScheme();
    const agent = await signIn(app(), await aMember(scheme, 'assessor'));
    const session = importSession(agent, scheme, services());
    const ring = [[54.86, 3], [54.86, 3.0002], [54.8602, 3.0002], [54.86, 3]] as const; // prettier-ignore
    const row = await session.send(geojson([feature({ ref: 'a' }, [...ring])], null));
    expect(row.options.place).toMatchObject({ crs: 4326, exchangeAxes: true });
    expect(row.counts).toMatchObject({ new: 1 });
  });
});
