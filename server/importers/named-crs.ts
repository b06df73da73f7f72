import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { z } from 'zod';
import type { FileCrs } from './source.ts';

const require = createRequire(import.meta.url);
const entrySchema = z.object({ kind: z.string(), wkt: z.string().nullable() });

/** What GeoJSON is in where it says nothing. */
export const WGS84: FileCrs = { code: 4326, said: 'WGS 84, as GeoJSON is by its standard' };

/** Those with heights above the ellipsoid, by the plain ones. */
const PLAIN: Readonly<Record<number, number>> = { 4979: 4326, 4937: 4258, 4327: 4326 };

/** The number of a system for plan positions: of one compounded with heights, that of its first half. */
export async function horizontalCode(code: number): Promise<number> {
  const plain = PLAIN[code];
  if (plain !== undefined) return plain;
  try {
    const folder = require.resolve('epsg-index/s/32631.json').replace(/32631\.json$/, '');
    const { kind, wkt } = entrySchema.parse(
      JSON.parse(await readFile(`${folder}${code}.json`, 'utf8')),
    );
    if (kind !== 'CRS-COMPOUNDCRS') return code;
    const half = /AUTHORITY\["EPSG","(\d+)"\]\],VERT_CS/.exec(wkt ?? '')?.[1];
    return half === undefined ? code : Number(half);
  } catch {
    return code;
  }
}

/** The number in a name such as "EPSG:25830", "urn:ogc:def:crs:EPSG::25830" or ".../crs/EPSG/0/25830". */
export function codeOfName(name: string): number | undefined {
  if (/\bCRS84h?$/i.test(name.trim())) return 4326;
  const digits = /\bEPSG[:/]+(?:[\d.]*[:/])?(\d{4,6})(?:\.0)?$/i.exec(name.trim())?.[1];
  // a compound urn names two systems: plan positions are in the first
  const first = /crs:EPSG:[\d.]*:(\d{4,6}),crs:EPSG/i.exec(name)?.[1];
  const code = first ?? digits;
  return code === undefined ? undefined : Number(code);
}

/** What a name says about a file's system; without a number where it is not known. */
export async function crsOfName(name: string): Promise<FileCrs> {
  const code = codeOfName(name);
  return code === undefined ? { said: name } : { code: await horizontalCode(code), said: name };
}
