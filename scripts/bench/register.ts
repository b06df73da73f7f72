import { Readable, Writable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Sequelize } from 'sequelize';
import { REGISTER_COLUMNS, REGISTER_ORDER } from '../../shared/schemas/register.ts';
import { isBesideColumn } from '../../shared/schemas/standing-columns.ts';
import { changeRegister } from '../../server/commands/change-register.ts';
import { connectDatabase } from '../../server/database/connect.ts';
import { exportedBuildings } from '../../server/exports/exported-buildings.ts';
import { exportedColumn } from '../../server/exports/register-columns.ts';
import { csvText } from '../../server/exports/write-csv.ts';
import { geojsonText } from '../../server/exports/write-geojson.ts';
import { writeXlsx } from '../../server/exports/write-xlsx.ts';
import { findBuildingsInBox } from '../../server/models/find-buildings-in-box.ts';
import { Scheme } from '../../server/models/scheme.ts';
import { registerOf } from '../../server/register/register-of.ts';
import { registerOrder } from '../../server/register/register-order.ts';
import { buildingTile } from '../../server/tiles/building-tile.ts';
import { tileBounds } from '../../server/tiles/tile-bounds.ts';
import { createTileCache } from '../../server/tiles/tile-cache.ts';
import { untilLookedAfter } from './looked-after.ts';
import { percentiles, times } from './percentiles.ts';
import { benchPages, type Bench, type NamedFilter } from './register-pages.ts';
import { townOfBoxes } from './town-of-boxes.ts';

const BUILDINGS = 100_000;
const TOWN = 2000;

const FILTERS: readonly NamedFilter[] = [
  ['words', { search: 'quay 12' }],
  ['a use', { any: { use: ['shop', null] } }],
  ['a range', { ranges: { eavesHeight: { from: 5, to: 9 } } }],
  ['unknown', { unknown: ['groundLevel', 'foundation'] }],
  ['assumed', { assumed: true }],
  ['nothing assumed', { assumed: false }],
  ['a box', { within: [3.01, 54.865, 3.03, 54.885] }],
];

function say(name: string, words: string): void {
  console.log(`register, ${name}: ${words}`);
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

async function benchExports({ services, register }: Bench): Promise<void> {
  const which = { filter: {}, sort: REGISTER_ORDER };
  for (const format of ['csv', 'geojson', 'xlsx'] as const) {
    const start = performance.now();
    const order = await registerOrder(services, register, which);
    const rows = exportedBuildings(services, register, order, format === 'geojson');
    const columns = REGISTER_COLUMNS.map(exportedColumn);
    const file = { title: 'Register', columns, rows, aboutTitle: 'About', about: [], beside: [] };
    if (format === 'xlsx') await writeXlsx(file, nowhere());
    else
      await pipeline(
        Readable.from(format === 'csv' ? csvText(file) : geojsonText(file)),
        nowhere(),
      );
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
    await untilLookedAfter(database, 'buildings');
    const register = await registerOf({ database }, scheme);
    const bench = { services: { database, tiles: createTileCache() }, register };
    const own = REGISTER_COLUMNS.filter((column) => !isBesideColumn(column));
    await benchPages(bench, own, FILTERS);
    await benchTiles(database, scheme);
    await benchExports(bench);
  } finally {
    await database.close();
  }
}
