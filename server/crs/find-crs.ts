import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { z } from 'zod';
import { crsEntrySchema, type CrsEntry } from './crs-entry.ts';
import { stretchFault } from './stretch-fault.ts';
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

/** What the index knows of an EPSG number, usable or not. */
export async function findEntry(code: number): Promise<CrsEntry | undefined> {
  const entry = await readEntry(code);
  return entry === undefined ? undefined : crsEntrySchema.parse(entry);
}

/** The system of an EPSG number, or why nothing can be drawn on it; undefined where there is none. */
export async function findCrs(code: number): Promise<UsableCrs | undefined> {
  const entry = await findEntry(code);
  return entry === undefined ? undefined : usableCrs(entry);
}

/** The same for a new scheme, whose walls must have the length that they have on the ground. */
export async function findCrsForScheme(code: number): Promise<UsableCrs | undefined> {
  const found = await findCrs(code);
  if (found === undefined || 'fault' in found) return found;
  const fault = stretchFault(found.crs);
  return fault === undefined ? found : { fault };
}
