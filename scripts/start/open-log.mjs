import { existsSync, openSync, renameSync, statSync } from 'node:fs';

const MOST_BYTES = 10 * 1024 * 1024;

/**
 * Opens a log to be written on at its end, so that what went wrong before a restart can still be read. One
 * that has grown large is put aside as `.1` first. `from` is where this run's lines begin.
 */
export function openLog(file) {
  if (existsSync(file) && statSync(file).size > MOST_BYTES) renameSync(file, `${file}.1`);
  const output = openSync(file, 'a');
  return { output, from: statSync(file).size };
}
