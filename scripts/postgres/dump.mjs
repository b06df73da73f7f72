import { spawnSync } from 'node:child_process';
import path from 'node:path';
import { postgresPrograms } from './programs.mjs';

/** Runs one of PostgreSQL's client programs on a database; its password stays out of the list of processes. */
function onDatabase(program, url, args) {
  const { hostname, port, username, password, pathname } = new URL(url);
  const database = decodeURIComponent(pathname.slice(1));
  const where = ['-h', hostname, '-p', port || '5432', '-U', decodeURIComponent(username)];
  const { status, stdout, stderr, error } = spawnSync(
    path.join(postgresPrograms(), program),
    [...where, '-w', ...args(database)],
    {
      encoding: 'utf8',
      env: { ...process.env, PGPASSWORD: decodeURIComponent(password) },
    },
  );
  if (status !== 0) throw new Error(`${program} failed: ${stderr || error}`);
  return stdout.trim();
}

/** The same address with another database. */
export function withDatabase(url, database) {
  const other = new URL(url);
  other.pathname = `/${encodeURIComponent(database)}`;
  return other.href;
}

/** Runs SQL and gives what psql prints. */
export function query(url, sql) {
  return onDatabase('psql', url, (database) => {
    return ['-d', database, '-v', 'ON_ERROR_STOP=1', '-Atqc', sql];
  });
}

/** Writes a database to a file of PostgreSQL's own format, without the sessions of who is signed in. */
export function dump(url, file) {
  onDatabase('pg_dump', url, (database) => {
    return ['-Fc', '--no-owner', '--exclude-table-data=sessions', '-f', file, database];
  });
}

/** Reads such a file into an empty database, all of it or nothing. */
export function load(url, file) {
  onDatabase('pg_restore', url, (database) => {
    return ['--no-owner', '--single-transaction', '--exit-on-error', '-d', database, file];
  });
}
