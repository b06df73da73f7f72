import { Readable, Writable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Sequelize } from 'sequelize';
import {
  REGISTER_COLUMNS,
  REGISTER_ORDER,
  type RegisterFilter,
  type RegisterSort,
} from '../../shared/schemas/register.ts';
import { changeRegister } from '../../server/commands/change-register.ts';
import { connectDatabase } from '../../server/database/connect.ts';
import { exportedBuildings } from '../../server/exports/exported-buildings.ts';
import { csvText } from '../../server/exports/write-csv.ts';
import { geojsonText } from '../../server/exports/write-geojson.ts';
import { writeXlsx } from '../../server/exports/write-xlsx.ts';
import { findBuildingsInBox } from '../../server/models/find-buildings-in-box.ts';
import { Scheme } from '../../server/models/scheme.ts';
import { registerOrder } from '../../server/register/register-order.ts';
import { registerPage } from '../../server/register/register-page.ts';
import type { Services } from '../../server/services.ts';
import { buildingTile } from '../../server/tiles/building-tile.ts';
import { tileBounds } from '../../server/tiles/tile-bounds.ts';
import { createTileCache } from '../../server/tiles/tile-cache.ts';
import { percentiles, times } from './percentiles.ts';
import { seededRandom } from './seeded-random.ts';
import { townOfBoxes } from './town-of-boxes.ts';

const BUILDINGS = 100_000;
const TOWN = 2000;
const RUNS = { first: 11, far: 5, turned: 21 } as const;
const FAR = 90_000;

const FILTERS: readonly (readonly [name: string, filter: RegisterFilter])[] = [
  ['words', { search: 'quay 12' }],
  ['a use', { any: { use: ['shop', null] } }],
  ['a range', { ranges: { eavesHeight: { from: 5, to: 9 } } }],
  ['unknown', { unknown: ['groundLevel', 'foundation'] }],
  ['assumed', { assumed: true }],
  ['nothing assumed', { assumed: false }],
  ['a box', { within: [3.01, 54.865, 3.03, 54.885] }],
];

type Bench = { readonly services: Pick<Services, 'database' | 'tiles'>; readonly scheme: Scheme };

function say(name: string, words: string): void {
  console.log(`register, ${name}: ${words}`);
}

function pageAt({ services, scheme }: Bench, filter: RegisterFilter, sort: RegisterSort) {
  return (offset: number) => registerPage(services, scheme, { filter, sort, offset, limit: 100 });
}

/** The first page, a jump far down before anything is in order, and pages turned anywhere after it. */
async function pageTimes(bench: Bench, filter: RegisterFilter, sort: RegisterSort) {
  const random = seededRandom(3);
  const anew = () => ({ ...bench, services: { ...bench.services, tiles: createTileCache() } });
  const page = pageAt(anew(), filter, sort);
  return {
    first: await times(RUNS.first, () => page(0)),
    far: await times(RUNS.far, () => pageAt(anew(), filter, sort)(FAR)),
    turned: await times(RUNS.turned, () => page(Math.floor(random() * FAR))),
  };
}

async function benchPages(bench: Bench): Promise<void> {
  const asked = [
    ...REGISTER_COLUMNS.flatMap((column) =>
      [false, true].map((descending) => {
        return [`by ${column}${descending ? ', descending' : ''}`, {}, { column, descending }] as const; // prettier-ignore
      }),
    ),
    ...FILTERS.map(([name, filter]) => [`filtered by ${name}`, filter, REGISTER_ORDER] as const),
  ];
  const all: Record<'first' | 'far' | 'turned', number[]> = { first: [], far: [], turned: [] };
  for (const [name, filter, sort] of asked) {
    const { first, far, turned } = await pageTimes(bench, filter, sort);
    say(name, `first page ${percentiles(first)}; far jump ${percentiles(far)}; then ${percentiles(turned)}`); // prettier-ignore
    all.first.push(...first);
    all.far.push(...far);
    all.turned.push(...turned);
  }
  say('all first pages', percentiles(all.first));
  say('all far jumps', percentiles(all.far));
  say('all pages turned then', percentiles(all.turned));
}

async function benchTiles(database: Sequelize, scheme: Scheme): Promise<void> {
  for (const z of [13, 14, 15, 16]) {
    const [x, y] = [((3.005 + 180) / 360) * 2 ** z, northOf(54.866, z)];
    const place = { z, x: Math.floor(x), y: Math.floor(y) };
    const found = await findBuildingsInBox(database, scheme.id, tileBounds(place));
    const taken = await times(25, () => buildingTile(database, scheme.id, place));
    say(`tile at zoom ${z} of ${found.length} buildings`, percentiles(taken));
  }
}

function northOf(latitude: number, z: number): number {
  const angle = (latitude * Math.PI) / 180;
  return ((1 - Math.asinh(Math.tan(angle)) / Math.PI) / 2) * 2 ** z;
}

function nowhere(): Writable {
  return new Writable({
    write: (_chunk, _encoding, done) => {
      done();
    },
  });
}

async function benchExports({ services, scheme }: Bench): Promise<void> {
  const which = { filter: {}, sort: REGISTER_ORDER };
  for (const format of ['csv', 'geojson', 'xlsx'] as const) {
    const start = performance.now();
    const order = await registerOrder(services, scheme, which);
    const buildings = exportedBuildings(services, order, format === 'geojson');
    const job = { columns: REGISTER_COLUMNS, buildings, about: [] };
    if (format === 'xlsx') await writeXlsx(job, nowhere());
    else
      await pipeline(Readable.from(format === 'csv' ? csvText(job) : geojsonText(job)), nowhere());
    const seconds = ((performance.now() - start) / 1000).toFixed(1);
    const megabytes = (process.memoryUsage().rss / 1e6).toFixed(0);
    say(`export as ${format}`, `${BUILDINGS} buildings in ${seconds} s, process ${megabytes} MB`);
  }
}

async function bringIn(database: Sequelize, count: number): Promise<Scheme> {
  const scheme = await Scheme.create({ name: `Bench of ${count}`, crs: 32631 });
  const start = performance.now();
  const cause = { kind: 'import', by: null } as const;
  await database.transaction((transaction) =>
    changeRegister(database, scheme, cause, { created: townOfBoxes(count) }, transaction),
  );
  const seconds = ((performance.now() - start) / 1000).toFixed(1);
  say('brought in', `${count} buildings in ${seconds} s, history and all`);
  return scheme;
}

/** Prints what the register takes with a hundred thousand buildings, and tiles of a small town too. */
export async function benchRegister(url: string): Promise<void> {
  const database = connectDatabase(url);
  try {
    await benchTiles(database, await bringIn(database, TOWN));
    const scheme = await bringIn(database, BUILDINGS);
    await database.query('analyze buildings');
    const bench = { services: { database, tiles: createTileCache() }, scheme };
    await benchPages(bench);
    await benchTiles(database, scheme);
    await benchExports(bench);
  } finally {
    await database.close();
  }
}
