import { cpSync } from 'node:fs';
import path from 'node:path';
import type { TestProject } from 'vitest/node';
import { createDataFolder } from './data-folder.ts';
import { startApp, stopApp, type RunningApp } from './running-app.ts';

type Demo = RunningApp & { readonly folder: string; readonly remove: () => void };

/** Starts the built application with the demo on a database of its own; the town is made only once. */
async function startDemo(name: string, first?: Demo): Promise<Demo> {
  const { folder, remove } = createDataFolder(name);
  if (first !== undefined) {
    cpSync(path.join(first.folder, 'demo'), path.join(folder, 'demo'), { recursive: true });
  }
  // every journey signs in from one address
  const app = await startApp(folder, { RATE_LIMIT: '1000' });
  return { ...app, folder, remove };
}

/** Starts a demo for each worker, so that journeys at the same time do not meet. */
export default async function setUp(project: TestProject): Promise<() => Promise<void>> {
  const first = await startDemo('e2e');
  const others = Array.from({ length: project.config.maxWorkers - 1 }, (_, k) =>
    startDemo(`e2e-${k + 2}`, first),
  );
  const demos = [first, ...(await Promise.all(others))];
  project.provide('demo', {
    places: demos.map(({ address, folder }) => ({ address, claim: path.join(folder, 'taken') })),
    password: first.password,
  });
  return async () => {
    await Promise.all(demos.map(stopApp));
    for (const { remove } of demos) remove();
  };
}
