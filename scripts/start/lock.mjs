import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { Refusal } from './refusal.mjs';

function textOf(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return undefined;
  }
}

/** When a process that lives began, so that a number used again is known; undefined for a dead one. */
function beginningOf(pid) {
  const [state, ...fields] = textOf(`/proc/${pid}/stat`)?.split(') ').at(-1).split(' ') ?? ['X'];
  if (state === 'X' || state === 'Z') return undefined;
  return `${textOf('/proc/sys/kernel/random/boot_id')?.trim()} ${fields[18]}`;
}

function holderIn(text) {
  try {
    const holder = JSON.parse(text);
    return beginningOf(holder.pid) === holder.began ? holder : undefined;
  } catch {
    // cut short by a power cut
    return undefined;
  }
}

function refuse(holder) {
  const where = holder?.address === undefined ? '' : `, at ${holder.address}`;
  throw new Refusal(
    `Groundsill already runs in this folder${where} (process ${holder?.pid ?? 'unknown'}).\n` +
      `Stop it with Ctrl-C where it was started, or with: kill ${holder?.pid}`,
  );
}

/** Takes a dead process's lock away, and puts back one that somebody living has taken meanwhile. */
function clear(file, text, mine) {
  const taken = `${mine}.taken`;
  renameSync(file, taken);
  const found = textOf(taken);
  if (found !== text) linkSync(taken, file);
  rmSync(taken);
}

function take(file, mine) {
  const text = textOf(file);
  if (text !== undefined) {
    const holder = holderIn(text);
    if (holder) refuse(holder);
    clear(file, text, mine);
  }
  linkSync(mine, file);
}

/** The running start of a data folder; undefined where there is none. */
export function runningStart(folder) {
  const text = textOf(path.join(folder, 'start.lock'));
  return text === undefined ? undefined : holderIn(text);
}

/**
 * Keeps a data folder for this process until it ends. What a killed process left behind is recognised,
 * since its number belongs to no process, or to one that began at another time.
 */
export function takeLock(folder) {
  const file = path.join(folder, 'start.lock');
  const mine = `${file}.${process.pid}`;
  const lock = { pid: process.pid, began: beginningOf(process.pid) };
  writeFileSync(mine, JSON.stringify(lock));
  try {
    take(file, mine);
  } catch (error) {
    // somebody was quicker between two of our steps
    if (error.code === 'EEXIST' || error.code === 'ENOENT') refuse(runningStart(folder));
    throw error;
  } finally {
    rmSync(mine, { force: true });
  }
  process.once('exit', () => rmSync(file, { force: true }));
  return {
    /** Tells who else starts here where the application is. */
    setAddress: (address) => {
      writeFileSync(mine, JSON.stringify({ ...lock, address }));
      renameSync(mine, file);
    },
  };
}
