import { existsSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { removeCluster, startCluster, type Cluster } from '../../scripts/postgres/cluster.mjs';

const FOLDER = path.resolve(import.meta.dirname, '../../.data/test-clusters');

/** Runs that were killed leave theirs behind. */
function sweep(): void {
  if (!existsSync(FOLDER)) return;
  for (const name of readdirSync(FOLDER)) {
    if (!existsSync(`/proc/${name}`)) removeCluster({ home: path.join(FOLDER, name) });
  }
}

/** A cluster for this run of the tests alone, so that two runs do not meet. */
export async function startThrowAwayCluster(): Promise<Cluster & { remove: () => void }> {
  sweep();
  const home = path.join(FOLDER, String(process.pid));
  const cluster = await startCluster({ home, fast: true });
  return {
    ...cluster,
    remove: () => {
      removeCluster({ home });
    },
  };
}
