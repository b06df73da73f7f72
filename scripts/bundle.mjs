import { mkdirSync, readdirSync, statSync } from 'node:fs';
import path from 'node:path';
import { root } from './packages.mjs';

function newestIn(folder) {
  let newest = 0;
  for (const entry of readdirSync(folder, { withFileTypes: true, recursive: true })) {
    if (!entry.isFile()) continue;
    newest = Math.max(newest, statSync(path.join(entry.parentPath, entry.name)).mtimeMs);
  }
  return newest;
}

/** Bundles a script written in TypeScript when a source is newer, and gives the bundle's path. */
export async function bundled(entry) {
  const name = path.basename(path.dirname(entry));
  const file = path.join(root, '.cache', `${name}.mjs`);
  const sources = ['shared', path.dirname(entry)].map((folder) =>
    newestIn(path.join(root, folder)),
  );
  const lock = statSync(path.join(root, 'package-lock.json')).mtimeMs;
  const built = statSync(file, { throwIfNoEntry: false })?.mtimeMs ?? 0;
  if (built > Math.max(...sources, lock)) return file;
  const { build } = await import('esbuild');
  mkdirSync(path.dirname(file), { recursive: true });
  await build({
    entryPoints: [path.join(root, entry)],
    outfile: file,
    bundle: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    logLevel: 'error',
  });
  return file;
}
