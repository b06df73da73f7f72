import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { confirmImport } from '../../server/commands/confirm-import.ts';
import { startImport } from '../../server/commands/start-import.ts';
import { toLonLat } from '../../server/crs/to-lon-lat.ts';
import { readEnv } from '../../server/env.ts';
import { Person } from '../../server/models/person.ts';
import type { RegisterImport } from '../../server/models/register-import.ts';
import { Scheme } from '../../server/models/scheme.ts';
import { openServices } from '../../server/open-services.ts';
import { townOfBoxes } from './town-of-boxes.ts';

const FOOTPRINTS = 100_000;
const UTM_31 = '+proj=utm +zone=31 +datum=WGS84 +units=m +no_defs';

function say(name: string, words: string): void {
  console.log(`import, ${name}: ${words}`);
}

/** The town as a file of GeoJSON in degrees, so that every corner has to be brought to the grid. */
function writeTown(file: string): void {
  const place = toLonLat(UTM_31);
  const features: string[] = [];
  for (const { reference, footprint, attributes } of townOfBoxes(FOOTPRINTS)) {
    const closed = footprint.map((part) => part.map((ring) => [...ring, ...ring.slice(0, 1)]));
    const coordinates = closed.map((part) => part.map((ring) => ring.map(place)));
    const geometry = { type: 'MultiPolygon', coordinates };
    const properties = { reference, ...attributes };
    features.push(JSON.stringify({ type: 'Feature', properties, geometry }));
  }
  writeFileSync(file, `{"type":"FeatureCollection","features":[${features.join(',\n')}]}`);
}

/** Waits until an import is in a state; the peak of memory is of the process with all its threads. */
async function until(row: RegisterImport, states: readonly string[]): Promise<number> {
  let peak = 0;
  while (!states.includes(row.state)) {
    if (row.state === 'failed') throw new Error(row.fault ?? 'The import failed.');
    peak = Math.max(peak, process.memoryUsage().rss);
    await sleep(100);
    await row.reload();
  }
  return peak;
}

/** The longest that a request would have waited because of what the process was doing, in milliseconds. */
function watchLoop(): () => number {
  let [last, worst] = [performance.now(), 0];
  const timer = setInterval(() => {
    worst = Math.max(worst, performance.now() - last - 20);
    last = performance.now();
  }, 20);
  return () => {
    clearInterval(timer);
    return worst;
  };
}

/** Prints what bringing in a hundred thousand footprints takes, from the file to the register. */
export async function benchImports(url: string): Promise<void> {
  const folder = mkdtempSync(path.join(tmpdir(), 'groundsill-bench-'));
  const { services, closeServices } = await openServices(
    readEnv({
      NODE_ENV: 'test',
      DATABASE_URL: url,
      SESSION_SECRET: 'a secret of thirty-two letters or more',
      PUBLIC_URL: 'http://127.0.0.1:4600',
      DEMO: 'true',
      LOG_LEVEL: 'error',
      UPLOADS_FOLDER: folder,
    }),
  );
  try {
    const file = path.join(folder, 'town.geojson');
    writeTown(file);
    const scheme = await Scheme.create({ name: 'Bench of imports', crs: 32631 });
    const person = await Person.create({ name: 'Bench', email: 'bench@example.org' });
    const actor = { id: person.id, isAdministrator: false };
    const stopWatching = watchLoop();
    const start = performance.now();
    const seconds = () => ((performance.now() - start) / 1000).toFixed(1);
    const row = await startImport(services, actor, scheme, { file, fileName: 'town.geojson' });
    const peaks = [await until(row, ['checking', 'asking'])];
    say('read', `${FOOTPRINTS} footprints in ${seconds()} s`);
    peaks.push(await until(row, ['asking']));
    say('checked', `after ${seconds()} s`);
    await confirmImport(services, actor, row, row.version);
    peaks.push(await until(row, ['done']));
    const peak = (Math.max(...peaks) / 1e6).toFixed(0);
    say('taken over', `after ${seconds()} s, at most ${peak} MB, requests held up by ${stopWatching().toFixed(0)} ms at most`); // prettier-ignore
  } finally {
    await closeServices();
    rmSync(folder, { recursive: true });
  }
}
