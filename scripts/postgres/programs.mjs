import { existsSync, readdirSync, realpathSync } from 'node:fs';
import { spawnSync } from 'node:child_process';
import path from 'node:path';

const DEBIAN = '/usr/lib/postgresql';

/** The folder of PostgreSQL's programs, the newest version first; undefined where it is not installed. */
export function postgresPrograms() {
  const versions = existsSync(DEBIAN) ? readdirSync(DEBIAN) : [];
  const [newest] = versions
    .filter((version) => existsSync(path.join(DEBIAN, version, 'bin', 'initdb')))
    .sort((a, b) => Number(b) - Number(a));
  if (newest !== undefined) return path.join(DEBIAN, newest, 'bin');
  const found = spawnSync('sh', ['-c', 'command -v initdb'], { encoding: 'utf8' }).stdout.trim();
  return found === '' ? undefined : path.dirname(realpathSync(found));
}
