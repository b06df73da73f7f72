import { spawn, type ChildProcess } from 'node:child_process';
import path from 'node:path';

const ROOT = path.resolve(import.meta.dirname, '../..');
const READY = 'Ctrl-C stops it.';

export type Run = {
  readonly process: ChildProcess;
  /** What it has printed so far. */
  readonly output: () => string;
  /** Its exit status, or the signal that ended it. */
  readonly ended: Promise<number | string | null>;
};

export type RunningApp = Run & { readonly address: string; readonly password: string };

/** What whoever runs the tests may have set for their own workbench. */
const UNSET = {
  NODE_ENV: undefined,
  DATABASE_URL: undefined,
  MIGRATE_URL: undefined,
  PUBLIC_URL: undefined,
  SMTP_URL: undefined,
  FIRST_ADMINISTRATOR: undefined,
  DEMO: undefined,
};

/** Runs one of the commands in scripts/ with its own environment on top of ours. */
export function runScript(
  name: string,
  args: readonly string[] = [],
  more: NodeJS.ProcessEnv = {},
): Run {
  const child = spawn(process.execPath, [`scripts/${name}.mjs`, ...args], {
    cwd: ROOT,
    env: { ...process.env, ...UNSET, ...more },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const texts: string[] = [];
  for (const stream of [child.stdout, child.stderr]) {
    stream.setEncoding('utf8').on('data', (text: string) => texts.push(text));
  }
  const ended = new Promise<number | string | null>((resolve) => {
    child.once('close', (code, signal) => {
      resolve(code ?? signal);
    });
  });
  return { process: child, output: () => texts.join(''), ended };
}

async function untilReady(run: Run): Promise<void> {
  const ready = new Promise<void>((resolve) => {
    run.process.stdout?.on('data', () => {
      if (run.output().includes(READY)) resolve();
    });
  });
  const early = run.ended.then(() => {
    throw new Error(`The application did not start:\n${run.output()}`);
  });
  await Promise.race([ready, early]);
  early.catch(() => undefined);
}

/** Starts the application as `npm start` does, with its data in a folder of its own, on a free port. */
export async function startApp(folder: string, more: NodeJS.ProcessEnv = {}): Promise<RunningApp> {
  const run = runScript('start', [], { DATA_DIR: folder, PORT: '0', ...more });
  await untilReady(run);
  const [, address = ''] = /runs at (\S+)/.exec(run.output()) ?? [];
  const [, password = ''] = /password (\S+)/.exec(run.output()) ?? [];
  return { ...run, address, password };
}

export async function stopApp({ process: child, ended }: Run): Promise<number | string | null> {
  child.kill('SIGTERM');
  return ended;
}
