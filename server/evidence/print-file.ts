import path from 'node:path';
import type { Env } from '../env.ts';

/** Where the file of a print is kept. */
export function printFile({ PRINTS_FOLDER }: Pick<Env, 'PRINTS_FOLDER'>, printId: string): string {
  return path.join(PRINTS_FOLDER, `${printId}.pdf`);
}

/** Where it is written until it is whole. */
export function unfinishedFile(file: string): string {
  return `${file}.unfinished`;
}
