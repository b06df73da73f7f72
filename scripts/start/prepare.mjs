import path from 'node:path';
import { installPackages } from '../packages.mjs';
import { portToServeOn } from './address.mjs';
import { openDatabase } from './database.mjs';
import { installDebian, POSTGRESQL } from './debian.mjs';
import { askInFirstAdministrator } from './first-administrator.mjs';
import { dataFolder, townFolder } from './folders.mjs';
import { takeLock } from './lock.mjs';
import { seed } from './seed.mjs';
import { runToEnd } from './server-process.mjs';
import { isDemo, settings } from './settings.mjs';
import { ensureTown } from './town.mjs';

async function migrate(run, { serverUrl, ownerUrl }) {
  if (ownerUrl === undefined) return { said: 'left as they are, without MIGRATE_URL' };
  const { applied } = await run('migrate', { DATABASE_URL: serverUrl, MIGRATE_URL: ownerUrl });
  return { said: applied.length === 0 ? 'there' : `${applied.length} applied` };
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
  const people = isDemo()
    ? await step('Demo data', () => seed(run))
    : await step('People', () => askInFirstAdministrator(run));
  return { folder, lock, env, database, people };
}
