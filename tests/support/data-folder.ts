import { existsSync, mkdirSync, readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { removeCluster } from '../../scripts/postgres/cluster.mjs';

const FOLDER = path.resolve(import.meta.dirname, '../../.data/test-folders');

function remove(folder: string): void {
  removeCluster({ home: path.join(folder, 'postgres') });
  rmSync(folder, { recursive: true, force: true });
}

/** Runs that were killed leave theirs behind. */
function sweep(): void {
  if (!existsSync(FOLDER)) return;
  for (const name of readdirSync(FOLDER)) {
    const pid = name.slice(name.lastIndexOf('-') + 1);
    if (!existsSync(`/proc/${pid}`)) remove(path.join(FOLDER, name));
  }
}

/** A data folder for this run of the tests alone. */
export function createDataFolder(name: string): { folder: string; remove: () => void } {
  sweep();
  const folder = path.join(FOLDER, `${name}-${process.pid}`);
  mkdirSync(folder, { recursive: true });
  return {
    folder,
    remove: () => {
      remove(folder);
    },
  };
}
