import { spawn } from 'node:child_process';
import { closeSync, readFileSync } from 'node:fs';
import { root } from '../packages.mjs';
import { openLog } from './open-log.mjs';
import { Refusal } from './refusal.mjs';

const PATIENCE_MS = 10_000;

/** What became of a program, in words, with the last lines of what it wrote. */
function endOf(name, status, { log, from }) {
  const lines = readFileSync(log)
    .subarray(from)
    .toString()
    .trim()
    .split('\n')
    .slice(-15)
    .join('\n');
  return `${name} ended (${status})${lines === '' ? '.' : `; the end of ${log} says:\n${lines}`}`;
}

/** Runs one of our programs with its output in a log file; `ended` is its exit status. */
function launch(args, { env, log }) {
  const { output, from } = openLog(log);
  const child = spawn(
    process.execPath,
    ['--enable-source-maps', '--max-semi-space-size=64', ...args],
    {
      cwd: root,
      env,
      stdio: ['ignore', output, output, 'ipc'],
    },
  );
  closeSync(output);
  const ended = new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code, signal) => resolve(code ?? signal));
  });
  return { child, ended, written: { log, from } };
}

/** Runs one of our programs to its end and gives what it reported. */
export async function runToEnd(args, options) {
  const { child, ended, written } = launch(args, options);
  let news = {};
  child.on('message', (message) => (news = message));
  // what was reported last may still be on its way when the program has ended
  const told = new Promise((resolve) => child.once('disconnect', resolve));
  const [status] = await Promise.all([ended, told]);
  if (status !== 0) throw new Refusal(endOf(args.at(-1), status, written));
  return news;
}

/**
 * Starts the server, to be stopped in the end, and waits until it listens. `ended` says why, should it end
 * by itself.
 */
export async function startServer(args, options, undo) {
  const { child, ended, written } = launch(args, options);
  undo.push(async () => {
    child.kill('SIGTERM');
    const forced = setTimeout(() => child.kill('SIGKILL'), PATIENCE_MS);
    await ended;
    clearTimeout(forced);
  });
  const reason = ended.then((status) => endOf('The server', status, written));
  const listening = new Promise((resolve) => child.once('message', resolve));
  const early = await Promise.race([listening.then(() => undefined), reason]);
  if (early !== undefined) throw new Refusal(early);
  return { ended: reason };
}
