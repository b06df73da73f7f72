// Runs before any package is installed: node's own modules only.
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

export const root = path.resolve(import.meta.dirname, '..');
const OLDEST_NODE = [20, 19];

export function requireNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  const [wantedMajor, wantedMinor] = OLDEST_NODE;
  if (major > wantedMajor || (major === wantedMajor && minor >= wantedMinor)) return;
  console.error(
    `Node ${OLDEST_NODE.join('.')} or newer is needed and this is ${process.version}. Install a newer Node and start again.`,
  );
  process.exit(1);
}

/** Installs the packages of the lock file unless exactly these are installed already. */
export function installPackages() {
  const hash = createHash('sha256').update(process.version);
  for (const file of ['package.json', 'package-lock.json']) {
    hash.update(readFileSync(path.join(root, file)));
  }
  const wanted = hash.digest('hex');
  const stamp = path.join(root, 'node_modules', '.installed');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return;
  console.error('Installing packages…');
  const { status } = spawnSync('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], {
    cwd: root,
    // stdout may be somebody's JSON; dev packages are needed whatever the environment says
    stdio: ['ignore', process.stderr, process.stderr],
    env: { ...process.env, NODE_ENV: 'development' },
  });
  if (status !== 0) {
    console.error('npm ci failed: see above. Check the network and start again.');
    process.exit(1);
  }
  writeFileSync(stamp, wanted);
}
