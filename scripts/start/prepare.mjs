import path from 'node:path';
import { installPackages } from '../packages.mjs';
import { portToServeOn } from './address.mjs';
import { openDatabase } from './database.mjs';
import { installDebian, POSTGRESQL } from './debian.mjs';
import { dataFolder, townFolder } from './folders.mjs';
import { takeLock } from './lock.mjs';
import { Refusal } from './refusal.mjs';
import { runToEnd } from './server-process.mjs';
import { isDemo, settings } from './settings.mjs';
import { ensureTown } from './town.mjs';

async function migrate(run, { serverUrl, ownerUrl }) {
  if (ownerUrl === undefined) return { said: 'left as they are, without MIGRATE_URL' };
  const { applied } = await run('migrate', { DATABASE_URL: serverUrl, MIGRATE_URL: ownerUrl });
  return { said: applied.length === 0 ? 'there' : `${applied.length} applied` };
}

async function seed(run) {
  const seeded = await run('seed');
  if (seeded.said !== 'not ours') return seeded;
  throw new Refusal(
    'This database holds people and is not the demo. To serve it as it is, set DEMO=false.',
  );
}

/**
 * Does everything up to a database that can be served from, step by step. What has to be stopped in the
 * end goes to `undo`, the newest last; `program` names a program of the server for node.
 */
export async function prepare({ step, undo, program, publicUrl, build }) {
  const folder = dataFolder();
  const lock = takeLock(folder);
  const port = await portToServeOn();
  await step('Packages', installPackages);
  if (process.env.DATABASE_URL === undefined) {
    await step('PostgreSQL', () => installDebian(POSTGRESQL));
  }
  if (build) await step('Build', build);
  if (isDemo()) await step('Demo town', () => ensureTown(townFolder()));
  const database = await step('Database', () => openDatabase(folder, undo));
  const env = settings({ folder, port, ...database, publicUrl: publicUrl(port) });
  function run(name, more = {}) {
    const log = path.join(folder, `${name}.log`);
    return runToEnd(program(name), { env: { ...env, ...more }, log });
  }
  await step('Migrations', () => migrate(run, database));
  const signIns = isDemo() ? await step('Demo data', () => seed(run)) : undefined;
  return { folder, lock, env, database, signIns };
}
