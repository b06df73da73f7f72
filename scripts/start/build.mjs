import { spawnSync } from 'node:child_process';
import { renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { root } from '../packages.mjs';
import { fingerprint, stampIn } from './sources.mjs';
import { Refusal } from './refusal.mjs';

const CLIENT = ['index.html', 'src', 'shared', 'vite.config.ts', 'tailwind.config.ts'];
const SERVER = ['server', 'shared'];
const COMMON = ['package-lock.json', 'tsconfig.json', 'scripts/start/build.mjs'];

const PROGRAMS = [
  'index',
  'migrate',
  'seed',
  'first-administrator',
  'jobs/thread',
  'runs/compute',
  'worker',
];

function buildClient(outDir) {
  const vite = path.join(root, 'node_modules/vite/bin/vite.js');
  const { status } = spawnSync(
    process.execPath,
    [vite, 'build', '--outDir', outDir, '--logLevel', 'error'],
    {
      cwd: root,
      stdio: ['ignore', process.stderr, process.stderr],
      env: {
        ...process.env,
        ...(process.stderr.isTTY ? {} : { NO_COLOR: '1' }),
        NODE_ENV: 'production',
      },
    },
  );
  if (status !== 0) throw new Refusal('The pages could not be built: see above.');
}

async function buildServer(outdir) {
  const { build } = await import('esbuild');
  await build({
    absWorkingDir: root,
    entryPoints: PROGRAMS.map((name) => `server/${name}.ts`),
    outdir,
    outExtension: { '.js': '.mjs' },
    bundle: true,
    packages: 'external',
    format: 'esm',
    platform: 'node',
    target: 'node20',
    sourcemap: true,
    logLevel: 'error',
  });
}

/**
 * Builds a part of dist/ unless it was built from these very sources. It is built beside the old one, which
 * is served from until the new one is whole.
 */
async function buildPart(name, sources, work) {
  const folder = path.join(root, 'dist', name);
  const wanted = fingerprint(...sources, ...COMMON);
  if (stampIn(folder) === wanted) return [];
  const beside = `${folder}-${process.pid}`;
  try {
    await work(beside);
    writeFileSync(path.join(beside, '.stamp'), wanted);
    rmSync(folder, { recursive: true, force: true });
    renameSync(beside, folder);
  } finally {
    rmSync(beside, { recursive: true, force: true });
  }
  return [name];
}

/** Builds client and server where their sources have changed, and says which. */
export async function build() {
  const built = [
    ...(await buildPart('client', CLIENT, buildClient)),
    ...(await buildPart('server', SERVER, buildServer)),
  ];
  return { said: built.length === 0 ? 'there' : `built ${built.join(' and ')}` };
}
