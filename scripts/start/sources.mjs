import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import { root } from '../packages.mjs';

function filesOf(place) {
  if (!statSync(place).isDirectory()) return [place];
  return readdirSync(place, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.join(entry.parentPath, entry.name))
    .sort();
}

/** A fingerprint of files and whole folders, by their names and what they hold. */
export function fingerprint(...places) {
  const hash = createHash('sha256').update(process.version);
  for (const place of places.map((name) => path.join(root, name)).filter((it) => existsSync(it))) {
    for (const file of filesOf(place)) {
      hash.update(`\n${path.relative(root, file)}\n`).update(readFileSync(file));
    }
  }
  return hash.digest('hex');
}

export function stampIn(folder) {
  const file = path.join(folder, '.stamp');
  return existsSync(file) ? readFileSync(file, 'utf8') : undefined;
}
