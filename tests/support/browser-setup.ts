import type { TestProject } from 'vitest/node';
import { createDataFolder } from './data-folder.ts';
import { startApp, stopApp } from './running-app.ts';

/** Starts the built application with the demo on a database of its own, for journeys in the browser. */
export default async function setUp(project: TestProject): Promise<() => Promise<void>> {
  const { folder, remove } = createDataFolder('e2e');
  // every journey signs in from one address
  const app = await startApp(folder, { RATE_LIMIT: '1000' });
  project.provide('demo', { address: app.address, password: app.password });
  return async () => {
    await stopApp(app);
    remove();
  };
}
