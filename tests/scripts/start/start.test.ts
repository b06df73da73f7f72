import { existsSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createDataFolder } from '../../support/data-folder.ts';
import { childrenOf, processesWith } from '../../support/processes.ts';
import { runScript, startApp, stopApp, type RunningApp } from '../../support/running-app.ts';

const { folder, remove } = createDataFolder('start');
let app: RunningApp;

function pidOf({ process: child }: RunningApp): number {
  return child.pid ?? 0;
}

function clusterOf({ output }: RunningApp): number[] {
  const [, port = ''] = /on port (\d+)/.exec(output()) ?? [];
  const found = processesWith('postgres', '-D').filter((pid) =>
    processesWith('-p', port).includes(pid),
  );
  // a process that the database has just made is called like itself for a moment
  const made = found.flatMap(childrenOf);
  return found.filter((pid) => !made.includes(pid));
}

async function answers({ address }: RunningApp): Promise<boolean> {
  const answer = await fetch(`${address}/api/session`).catch(() => undefined);
  return answer?.status === 200;
}

beforeAll(async () => {
  app = await startApp(folder);
});

afterAll(async () => {
  await stopApp(app);
  remove();
});

// each goes on from what the one before left running
describe('npm start', () => {
  it('serves the demo and says where, and who may sign in', async () => {
    const answer = await fetch(`${app.address}/api/session`);
    expect(await answer.json()).toMatchObject({ person: null, demo: true });
    expect((await fetch(`${app.address}/tiles/tiles.json`)).status).toBe(200);
    expect((await fetch(`${app.address}/tiles/16/0/0.pbf`)).status).toBe(404);
    for (const role of ['administrator', 'designer', 'second-assessor', 'owner', 'witness']) {
      expect(app.output()).toContain(`${role}@example.org`);
    }
  });

  it('refuses a second start in the same folder and says what to do', async () => {
    const second = runScript('start', [], { DATA_DIR: folder, PORT: '0' });
    expect(await second.ended).toBe(1);
    expect(second.output()).toContain(`already runs in this folder, at ${app.address}`);
    expect(second.output()).toContain(`kill ${pidOf(app)}`);
    expect(await answers(app)).toBe(true);
  });

  it('says what to do where the port is taken', async () => {
    const other = path.join(folder, 'other');
    const port = new URL(app.address).port;
    const run = runScript('start', [], { DATA_DIR: other, PORT: port });
    expect(await run.ended).toBe(1);
    expect(run.output()).toContain(`Port ${port} is taken`);
    expect(run.output()).toContain(`PORT=${Number(port) + 1} npm start`);
  });

  it('ends with the reason when server and database are killed, and starts again', async () => {
    for (const pid of [...clusterOf(app), ...childrenOf(pidOf(app))]) process.kill(pid, 'SIGKILL');
    expect(await app.ended).toBe(1);
    expect(app.output()).toMatch(/(The server ended \(SIGKILL\)|The database has ended)/);
    app = await startApp(folder);
    expect(await answers(app)).toBe(true);
    expect(app.output()).toMatch(/Demo data\s+… there/);
  });

  it('leaves no server behind when it is killed, and knows its own lock for a dead one', async () => {
    const [server = 0] = childrenOf(pidOf(app));
    app.process.kill('SIGKILL');
    await app.ended;
    await expect.poll(() => existsSync(`/proc/${server}`), { timeout: 60_000 }).toBe(false);
    app = await startApp(folder);
    expect(await answers(app)).toBe(true);
  });

  it('stops all that it started', async () => {
    expect(clusterOf(app)).toHaveLength(1);
    expect(await stopApp(app)).toBe(0);
    expect(await answers(app)).toBe(false);
    expect(clusterOf(app)).toEqual([]);
    expect(existsSync(path.join(folder, 'start.lock'))).toBe(false);
  });
});
