import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import path from 'node:path';
import { pipeline } from 'node:stream/promises';
import type { Env } from '../env.ts';

/** Where the file of a print is kept. */
export function printFile({ PRINTS_FOLDER }: Pick<Env, 'PRINTS_FOLDER'>, printId: string): string {
  return path.join(PRINTS_FOLDER, `${printId}.pdf`);
}

/** Whose print a file is, by its name; undefined where it is none. */
export function printOfFile(name: string): string | undefined {
  return /^([0-9a-f-]{36})\.pdf$/.exec(name)?.[1];
}

/** Where it is written until it is whole. */
export function unfinishedFile(file: string): string {
  return `${file}.unfinished`;
}

/** The SHA-256 of a file in hexadecimal. */
export async function fingerprintOf(file: string): Promise<string> {
  const hash = createHash('sha256');
  await pipeline(createReadStream(file), hash);
  return hash.digest('hex');
}
