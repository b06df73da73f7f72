import path from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { startCluster } from '../postgres/cluster.mjs';
import { answers } from '../postgres/ports.mjs';
import { reachDatabase } from './reach-database.mjs';

export const DATABASE = 'groundsill';
const BETWEEN_LOOKS_MS = 2000;

/** Resolves when nothing has answered on the port twice in a row. */
async function silenceOn(port) {
  for (let silent = 0; silent < 2; silent = (await answers(port)) ? 0 : silent + 1) {
    await wait(BETWEEN_LOOKS_MS, undefined, { ref: false });
  }
}

/** The database that the environment names, or one of our own in the data folder, to stop in the end. */
export async function openDatabase(folder, undo) {
  const { DATABASE_URL, MIGRATE_URL } = process.env;
  if (DATABASE_URL !== undefined) {
    await reachDatabase(DATABASE_URL, MIGRATE_URL);
    return {
      said: 'the one of DATABASE_URL',
      serverUrl: DATABASE_URL,
      ownerUrl: MIGRATE_URL,
      ended: new Promise(() => undefined),
    };
  }
  const cluster = await startCluster({ home: path.join(folder, 'postgres') });
  undo.push(cluster.stop);
  cluster.ensureDatabase(DATABASE);
  return {
    said: `on port ${cluster.port}`,
    serverUrl: cluster.serverUrl(DATABASE),
    ownerUrl: cluster.ownerUrl(DATABASE),
    ended: silenceOn(cluster.port).then(() => 'The database has ended.'),
  };
}
