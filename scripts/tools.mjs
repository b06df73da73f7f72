import { spawn } from 'node:child_process';
import path from 'node:path';
import { root } from './packages.mjs';

const PROGRAMS = {
  eslint: 'node_modules/eslint/bin/eslint.js',
  knip: 'node_modules/knip/bin/knip.js',
  prettier: 'node_modules/prettier/bin/prettier.cjs',
  tsc: 'node_modules/typescript/bin/tsc',
  vitest: 'node_modules/vitest/vitest.mjs',
};

/** A run of a tool: its title, and the command with spaces between its words. */
function tool(title, command) {
  const [program, ...args] = command.split(' ');
  return { title, program, args };
}

export const TYPES = tool('Types', 'tsc --noEmit --incremental --tsBuildInfoFile .cache/tsc.json');
const CACHE = '--cache --cache-strategy=content --cache-location=.cache/eslint';
/** The cache is quick, but blind to a fault that a type changed elsewhere brings into an unchanged file. */
export const LINT = tool('Lint', `eslint . --max-warnings=0${process.env.CI ? '' : ` ${CACHE}`}`);
export const FORMAT = tool(
  'Format',
  'prettier --check . --log-level=warn --cache --cache-strategy=content --cache-location=.cache/prettier',
);
export const UNUSED = tool('Unused code', 'knip --no-progress');
export const ARCHITECTURE = tool(
  'Architecture',
  'vitest run --project architecture --reporter=agent',
);
export const TESTS = tool(
  'Tests',
  'vitest run --allowOnly=false --reporter=default --reporter=json --outputFile.json=.cache/vitest.json',
);

/** Runs a tool and says whether it passed, with its output where that is `kept` and not shown. */
export async function run({ program, args }, { kept = false, more = [] } = {}) {
  const file = path.join(root, PROGRAMS[program]);
  const output = kept ? 'pipe' : 'inherit';
  const plain = kept || !process.stdout.isTTY;
  const child = spawn(process.execPath, [file, ...args, ...more], {
    cwd: root,
    stdio: ['ignore', output, output],
    // whatever the environment says, tests run as tests; no colours in what is kept
    env: { ...process.env, NODE_ENV: 'test', ...(plain ? { NO_COLOR: '1' } : {}) },
  });
  const texts = [];
  for (const stream of [child.stdout, child.stderr]) {
    stream?.setEncoding('utf8').on('data', (text) => texts.push(text));
  }
  const status = await new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('close', resolve);
  });
  return { passed: status === 0, output: texts.join('').trim() };
}
