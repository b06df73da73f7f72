import { randomBytes } from 'node:crypto';
import {
  appendFileSync,
  chownSync,
  existsSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import { freePort } from './ports.mjs';

export const SUPERUSER = 'groundsill_super';

const SETTINGS = [
  "listen_addresses = '127.0.0.1'",
  "unix_socket_directories = ''",
  'max_connections = 100',
  'shared_buffers = 256MB',
  // a town that is brought in whole is not written twice because of checkpoints on the way
  'max_wal_size = 2GB',
];
const WITHOUT_CARE = ['fsync = off', 'synchronous_commit = off', 'full_page_writes = off'];

function secret() {
  return randomBytes(18).toString('base64url');
}

/** Makes the cluster anew unless it was made to the end, and gives its port and passwords. */
export async function makeCluster({ home, user, data, mustRun }, { fast }) {
  const done = path.join(home, 'made.json');
  if (existsSync(done) && existsSync(path.join(data, 'global', 'pg_control'))) {
    return JSON.parse(readFileSync(done, 'utf8'));
  }
  rmSync(data, { recursive: true, force: true });
  const passwords = { superuser: secret(), owner: secret(), server: secret() };
  const made = { port: await freePort(), passwords };
  const passwordFile = path.join(home, 'password');
  writeFileSync(passwordFile, `${passwords.superuser}\n`, { mode: 0o600 });
  if (user) chownSync(passwordFile, user.uid, user.gid);
  mustRun('initdb', [
    ...['-D', data, '-U', SUPERUSER, '-E', 'UTF8', '--locale=C.UTF-8', '--pwfile', passwordFile],
    ...['--auth-local=scram-sha-256', '--auth-host=scram-sha-256', '--no-instructions'],
    ...(fast ? ['--no-sync'] : []),
  ]);
  rmSync(passwordFile);
  const settings = fast ? [...SETTINGS, ...WITHOUT_CARE] : SETTINGS;
  appendFileSync(path.join(data, 'postgresql.conf'), `\n${settings.join('\n')}\n`);
  writeFileSync(done, JSON.stringify(made), { mode: 0o600 });
  return made;
}
