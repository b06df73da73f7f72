import path from 'node:path';
import { build } from './build.mjs';
import { prepare } from './prepare.mjs';
import { sayWhere } from './say-where.mjs';
import { startServer } from './server-process.mjs';
import { whenAborted } from './signals.mjs';
import { stepper } from './step.mjs';
import { untilStopped } from './until-stopped.mjs';

function program(name) {
  return [`dist/server/${name}.mjs`];
}

function publicUrl(port) {
  return `http://127.0.0.1:${port}`;
}

async function serve(signal, undo) {
  const step = stepper(signal);
  const { folder, lock, env, database, people } = await prepare({
    step,
    undo,
    program,
    publicUrl,
    build,
  });
  const log = path.join(folder, 'server.log');
  const server = await step('Server', () => startServer(program('index'), { env, log }, undo));
  lock.setAddress(env.PUBLIC_URL);
  sayWhere(env.PUBLIC_URL, people);
  const ended = Promise.race([server.ended, database.ended]);
  const whatNext = ended.then((reason) => `${reason}\nRun npm start again; the log is ${log}.`);
  return Promise.race([whenAborted(signal), whatNext]);
}

/** Serves the built application. */
export function start() {
  return untilStopped(serve);
}
