import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { z } from 'zod';
import { foldedWords } from './folded-words.ts';
import { crsEntrySchema, type CrsEntry } from './crs-entry.ts';

/** A system with its words as searches compare them. */
export type ListedCrs = {
  readonly entry: CrsEntry;
  readonly nameWords: readonly string[];
  readonly areaWords: readonly string[];
};

const LAST_EPSG = 32767;

async function readList(): Promise<readonly ListedCrs[]> {
  const file = createRequire(import.meta.url).resolve('epsg-index/all.json');
  const all: unknown = JSON.parse(await readFile(file, 'utf8'));
  return Object.values(z.record(z.string(), crsEntrySchema).parse(all))
    .filter(({ kind, unit, code }) => {
      return kind === 'CRS-PROJCRS' && unit === 'metre' && code <= LAST_EPSG;
    })
    .map((entry) => ({
      entry,
      nameWords: foldedWords(entry.name),
      areaWords: foldedWords(entry.area ?? ''),
    }));
}

/** Reads the list when it is first asked for, and once: it is large and never changes. */
function readOnce(): () => Promise<readonly ListedCrs[]> {
  let list: Promise<readonly ListedCrs[]> | undefined;
  return () => (list ??= readList());
}

export const crsList = readOnce();
