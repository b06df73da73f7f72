import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import path from 'node:path';

const ROOT = path.resolve(import.meta.dirname, '../..');

export type ProcessName = 'index' | 'worker';

/** The server and a worker beside it, as they are in earnest, each of which can be killed and started again. */
export function killableProcesses(url: string, more: NodeJS.ProcessEnv = {}) {
  const running = new Map<ProcessName, ChildProcess>();
  const env = {
    ...process.env,
    NODE_ENV: 'production',
    DATABASE_URL: url,
    SESSION_SECRET: 'a secret of thirty-two letters or more',
    PUBLIC_URL: 'http://127.0.0.1:4600',
    DEMO: 'true',
    PORT: '0',
    LOG_LEVEL: 'error',
    ...more,
  };
  async function launch(name: ProcessName): Promise<void> {
    const child = spawn(process.execPath, [`dist/server/${name}.mjs`], {
      cwd: ROOT,
      env,
      stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    });
    running.set(name, child);
    await once(child, 'message');
  }
  async function kill(name: ProcessName, signal: NodeJS.Signals): Promise<void> {
    const child = running.get(name);
    running.delete(name);
    if (child === undefined) return;
    const ended = once(child, 'exit');
    child.kill(signal);
    await ended;
  }
  return { launch, kill };
}
