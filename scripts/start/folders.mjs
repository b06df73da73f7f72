import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { root } from '../packages.mjs';

/** The folder of everything that outlives a restart: DATA_DIR, or .data in the project. */
export function dataFolder() {
  const folder = path.resolve(root, process.env.DATA_DIR ?? '.data');
  mkdirSync(folder, { recursive: true });
  return folder;
}

/** Where the demo town's files are. */
export function townFolder() {
  return path.join(dataFolder(), 'demo');
}
