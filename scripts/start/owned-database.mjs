import path from 'node:path';
import { startCluster } from '../postgres/cluster.mjs';
import { DATABASE } from './database.mjs';
import { installDebian, POSTGRESQL } from './debian.mjs';
import { dataFolder } from './folders.mjs';
import { runningStart, takeLock } from './lock.mjs';
import { Refusal } from './refusal.mjs';

/**
 * Does something with the database as the role that owns it: the one of MIGRATE_URL, or our own, which is
 * started for it where it does not run. `alone`: only while nothing serves from it.
 */
export async function withOwnedDatabase({ alone }, work) {
  installDebian(POSTGRESQL);
  const { DATABASE_URL, MIGRATE_URL } = process.env;
  if (MIGRATE_URL !== undefined) return work(MIGRATE_URL);
  if (DATABASE_URL !== undefined) {
    throw new Refusal('DATABASE_URL is given without MIGRATE_URL, the address of the owning role.');
  }
  const folder = dataFolder();
  const running = runningStart(folder);
  if (running && alone) {
    throw new Refusal(
      `Groundsill runs (process ${running.pid}). Stop it first, with Ctrl-C or kill.`,
    );
  }
  if (!running) takeLock(folder);
  const cluster = await startCluster({ home: path.join(folder, 'postgres') });
  try {
    cluster.ensureDatabase(DATABASE);
    return await work(cluster.ownerUrl(DATABASE));
  } finally {
    if (!running) cluster.stop();
  }
}
