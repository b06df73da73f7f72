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

async function readEvery(): Promise<readonly CrsEntry[]> {
  const file = createRequire(import.meta.url).resolve('epsg-index/all.json');
  const all: unknown = JSON.parse(await readFile(file, 'utf8'));
  const entries = Object.values(z.record(z.string(), crsEntrySchema).parse(all));
  return entries.filter(({ code }) => code <= LAST_EPSG);
}

async function readList(isListed: (entry: CrsEntry) => boolean): Promise<readonly ListedCrs[]> {
  return (await everyCrs()).filter(isListed).map((entry) => ({
    entry,
    nameWords: foldedWords(entry.name),
    areaWords: foldedWords(entry.area ?? ''),
  }));
}

/** Reads a list when it is first asked for, and once: it is large and never changes. */
function readOnce<T>(read: () => Promise<T>): () => Promise<T> {
  let list: Promise<T> | undefined;
  return () => (list ??= read());
}

/** Every EPSG system of the index. */
export const everyCrs = readOnce(readEvery);

/** The projected ones in metres. */
export const crsList = readOnce(() =>
  readList(({ kind, unit }) => kind === 'CRS-PROJCRS' && unit === 'metre'),
);

/** The projected ones in any unit and those in degrees. */
export const fileCrsList = readOnce(() =>
  readList(({ kind }) => kind === 'CRS-PROJCRS' || kind === 'CRS-GEOGCRS'),
);
