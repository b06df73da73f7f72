import { spawnSync } from 'node:child_process';
import { postgresPrograms } from '../postgres/programs.mjs';
import { Refusal } from './refusal.mjs';

function has(program) {
  return () => spawnSync('sh', ['-c', `command -v ${program}`]).status === 0;
}

export const POSTGRESQL = { name: 'postgresql', isThere: () => postgresPrograms() !== undefined };
export const CHROMIUM = {
  name: 'chromium-headless-shell',
  isThere: has('chromium-headless-shell'),
};
export const POPPLER = { name: 'poppler-utils', isThere: has('pdftotext') };

const APT = [
  'apt-get',
  ...['-o', 'DPkg::Lock::Timeout=300', '-o', 'Acquire::Retries=3'],
  ...['-o', 'Dpkg::Options::=--force-confold', '-q', '-y', '--no-install-recommends'],
];
/** Debian would start a cluster of its own beside ours. */
const NO_CLUSTER =
  'f=/etc/postgresql-common/createcluster.conf; test -e $f || ' +
  "{ mkdir -p /etc/postgresql-common && echo 'create_main_cluster = false' > $f; }";

function asRoot(...command) {
  const [program, ...args] = process.getuid() === 0 ? command : ['sudo', '-n', ...command];
  const { status } = spawnSync(program, args, {
    stdio: ['ignore', 'ignore', 'inherit'],
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
  });
  return status === 0;
}

function requireMeans(names) {
  const means = 'Install it by hand and start again:';
  if (!has('apt-get')()) {
    throw new Refusal(`${names} is missing and there is no apt-get here. ${means} ${names}`);
  }
  if (process.getuid() !== 0 && !asRoot('true')) {
    throw new Refusal(
      `${names} is missing, and only root may install it (sudo asks for a password here). ` +
        `${means}\n  sudo apt-get install ${names}`,
    );
  }
}

/** Installs those of some Debian packages that are missing, and says what it did. */
export function installDebian(...wanted) {
  const missing = wanted.filter(({ isThere }) => !isThere());
  if (missing.length === 0) return { said: 'there' };
  const names = missing.map(({ name }) => name);
  const list = names.join(' ');
  requireMeans(list);
  if (missing.includes(POSTGRESQL)) asRoot('sh', '-c', NO_CLUSTER);
  const install = () => asRoot(...APT, 'install', ...names);
  if (!install() && !(asRoot(...APT, 'update') && install())) {
    throw new Refusal(
      `apt-get could not install ${list}: see above. Mend that, or try by hand: apt-get install ${list}`,
    );
  }
  return { said: `installed ${list}` };
}
