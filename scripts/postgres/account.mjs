import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { chownSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { postgresPrograms } from './programs.mjs';
import { unprivilegedUser } from './unprivileged-user.mjs';

/** A folder that the account can enter: a checkout under a closed home folder is not one. */
function enterable(home, user) {
  mkdirSync(home, { recursive: true, mode: 0o755 });
  if (user === undefined) return home;
  const entered = spawnSync('/bin/sh', ['-c', 'cd "$1"', 'sh', home], { ...user, cwd: '/' });
  if (entered.status === 0) return home;
  const name = createHash('sha256').update(home).digest('hex').slice(0, 12);
  const elsewhere = path.join('/var/tmp', `groundsill-${name}`);
  mkdirSync(elsewhere, { recursive: true, mode: 0o755 });
  return elsewhere;
}

/**
 * The folder in which a cluster lives and PostgreSQL's programs, run as an account that may use both:
 * `run` gives what spawnSync gives, `mustRun` the output or an error with what the program said.
 */
export function openAccount(wanted) {
  const programs = postgresPrograms();
  if (programs === undefined) {
    throw new Error('PostgreSQL is not installed: apt-get install postgresql');
  }
  const user = unprivilegedUser();
  const home = enterable(wanted, user);
  if (user) chownSync(home, user.uid, user.gid);
  const env = { PATH: process.env.PATH, LC_ALL: 'C.UTF-8', TZ: 'UTC', HOME: home };

  function run(program, args, more = {}) {
    const options = { cwd: home, encoding: 'utf8', ...user, ...more, env: { ...env, ...more.env } };
    return spawnSync(path.join(programs, program), args, options);
  }
  function mustRun(program, args, more) {
    const { status, stdout, stderr, error } = run(program, args, more);
    if (status === 0) return stdout;
    throw new Error(`${program} failed: ${stderr || stdout || error}`);
  }
  return { home, user, data: path.join(home, 'data'), run, mustRun };
}
