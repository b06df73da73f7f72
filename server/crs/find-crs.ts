import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { z } from 'zod';
import { crsEntrySchema } from './crs-entry.ts';
import { usableCrs, type UsableCrs } from './usable-crs.ts';

const require = createRequire(import.meta.url);
const errorSchema = z.object({ code: z.literal('ENOENT') });

/** The file of one system is small; the whole list is read for searches only. */
async function readEntry(code: number): Promise<unknown> {
  const folder = require.resolve('epsg-index/s/32631.json').replace(/32631\.json$/, '');
  try {
    return JSON.parse(await readFile(`${folder}${code}.json`, 'utf8'));
  } catch (error) {
    if (errorSchema.safeParse(error).success) return undefined;
    throw error;
  }
}

/** The system of an EPSG number, or why a scheme cannot be drawn on it; undefined where there is none. */
export async function findCrs(code: number): Promise<UsableCrs | undefined> {
  const entry = await readEntry(code);
  return entry === undefined ? undefined : usableCrs(crsEntrySchema.parse(entry));
}
