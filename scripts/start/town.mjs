import { rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { bundled } from '../bundle.mjs';
import { root } from '../packages.mjs';
import { fingerprint, stampIn } from './sources.mjs';

const BUILDINGS = 2000;
const SOURCES = [
  'scripts/make-demo',
  'shared/schemas/basemap.ts',
  'shared/schemas/party-imports.ts',
  'server/seed/demo-alignments.ts',
];
const TILES = path.join(root, 'public/tiles');

/** Makes the town and its tiles unless both were made from these very sources for as many buildings. */
export async function ensureTown(folder, { buildings = stampIn(folder)?.split(' ')[1] } = {}) {
  const wanted = `${fingerprint(...SOURCES)} ${buildings ?? BUILDINGS}`;
  const stamps = [folder, TILES].map((place) => path.join(place, '.stamp'));
  if ([folder, TILES].every((place) => stampIn(place) === wanted)) return { said: 'there' };
  for (const stamp of stamps) rmSync(stamp, { force: true });
  const { makeDemo } = await import(await bundled('scripts/make-demo/make-demo.ts'));
  const said = makeDemo(Number(buildings ?? BUILDINGS), folder, TILES);
  for (const stamp of stamps) writeFileSync(stamp, wanted);
  return { said };
}
