import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { root } from '../packages.mjs';
import { Refusal } from './refusal.mjs';

const WHY = {
  EEXIST: 'it is a file',
  ENOTDIR: 'a part of its path is a file',
  EACCES: 'this account may not make it',
  EPERM: 'this account may not make it',
  EROFS: 'nothing can be written there',
  ENOENT: 'it cannot be made there',
};

/** The folder of everything that outlives a restart: DATA_DIR, or .data in the project. */
export function dataFolder() {
  const folder = path.resolve(root, process.env.DATA_DIR ?? '.data');
  try {
    mkdirSync(folder, { recursive: true });
  } catch (error) {
    throw new Refusal(`${folder} cannot be the data folder: ${WHY[error.code] ?? error.message}.`);
  }
  return folder;
}

/** Where the demo town's files are. */
export function townFolder() {
  return path.join(dataFolder(), 'demo');
}
