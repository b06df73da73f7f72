import path from 'node:path';
import { removeCluster, startCluster } from '../postgres/cluster.mjs';
import { openMigrations } from '../../server/database/migrate.ts';

const FOLDER = path.resolve(import.meta.dirname, '../../.data/bench-clusters');
const DATABASE = 'bench';

/** A migrated database on a cluster of this run alone, as safe against power cuts as a real one. */
export async function startBenchDatabase(): Promise<{ url: string; remove: () => void }> {
  const home = path.join(FOLDER, String(process.pid));
  const cluster = await startCluster({ home });
  cluster.ensureDatabase(DATABASE);
  const url = cluster.serverUrl(DATABASE);
  const migrations = openMigrations(cluster.ownerUrl(DATABASE), url);
  await migrations.up();
  await migrations.close();
  return {
    url,
    remove: () => {
      removeCluster({ home });
    },
  };
}
