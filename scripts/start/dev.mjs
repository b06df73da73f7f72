import { spawn } from 'node:child_process';
import { root } from '../packages.mjs';
import { prepare } from './prepare.mjs';
import { sayWhere } from './say-where.mjs';
import { whenAborted } from './signals.mjs';
import { stepper } from './step.mjs';
import { untilStopped } from './until-stopped.mjs';

function program(name) {
  return ['--import', 'tsx', `server/${name}.ts`];
}

/** The pages are served beside the server, which gives them what they ask for. */
function pagesPort(port) {
  return Number(port) + 1;
}

/** Links in letters lead to where the pages are. */
function publicUrl(port) {
  return `http://127.0.0.1:${pagesPort(port)}`;
}

/** Runs a program of node with its output on the screen. */
function show(args, env, undo) {
  const child = spawn(process.execPath, args, {
    cwd: root,
    env,
    stdio: ['ignore', 'inherit', 'inherit'],
  });
  const ended = new Promise((resolve) => child.once('exit', resolve));
  undo.push(async () => {
    child.kill('SIGTERM');
    await ended;
  });
  return ended.then((status) => `${args.join(' ')} ended (${status}): see above.`);
}

async function serve(signal, undo) {
  const prepared = await prepare({ step: stepper(signal), undo, program, publicUrl });
  const env = { ...prepared.env, NODE_ENV: 'development' };
  const [flags, entry] = [
    ['--import', 'tsx', '--watch', '--watch-preserve-output'],
    'server/index.ts',
  ];
  const server = show([...flags, entry], env, undo);
  const vite = ['node_modules/vite/bin/vite.js', '--host', '127.0.0.1', '--strictPort'];
  const pages = show([...vite, '--port', String(pagesPort(env.PORT))], env, undo);
  prepared.lock.setAddress(env.PUBLIC_URL);
  sayWhere(env.PUBLIC_URL, prepared.people);
  return Promise.race([whenAborted(signal), server, pages, prepared.database.ended]);
}

/** Serves from the sources, and again whenever one changes. */
export function dev() {
  return untilStopped(serve);
}
