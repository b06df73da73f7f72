import { chmodSync, existsSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { answers, freePort, isFree } from './ports.mjs';

const LIMIT_MS = 90_000;

/** After a crash the number in the lock file may have passed to some other program. */
function dropStaleLock(data) {
  const lock = path.join(data, 'postmaster.pid');
  if (!existsSync(lock)) return;
  const [pid] = readFileSync(lock, 'utf8').split('\n');
  const commandLine = `/proc/${pid}/cmdline`;
  if (!existsSync(commandLine)) return;
  if (!readFileSync(commandLine, 'utf8').includes('postgres')) rmSync(lock);
}

function endOfLog(log) {
  return existsSync(log) ? readFileSync(log, 'utf8').split('\n').slice(-12).join('\n') : '';
}

/**
 * Starts a cluster that was made, and gives the port on which it answers. One that runs already is taken
 * as it is; only a connection tells, since `pg_ctl status` lies just after kill -9.
 */
export async function bringUp({ home, data, run }, wantedPort) {
  chmodSync(data, 0o700);
  const log = path.join(home, 'postgres.log');
  const began = Date.now();
  let failures = 0;
  while (Date.now() - began < LIMIT_MS && failures < 3) {
    if (run('pg_ctl', ['-D', data, 'status']).status === 0) {
      const port = Number(readFileSync(path.join(data, 'postmaster.pid'), 'utf8').split('\n')[3]);
      if (port > 0 && (await answers(port))) return port;
    } else {
      dropStaleLock(data);
      const port = (await isFree(wantedPort)) ? wantedPort : await freePort();
      const args = ['-D', data, '-w', '-t', '60', '-l', log, '-o', `-p ${port}`, 'start'];
      // a pipe would be kept open by the server
      if (run('pg_ctl', args, { stdio: 'ignore' }).status !== 0) failures += 1;
      else continue;
    }
    await wait(150);
  }
  throw new Error(`PostgreSQL does not start; the end of ${log} says:\n${endOfLog(log)}`);
}
