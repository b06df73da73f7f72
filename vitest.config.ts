import { availableParallelism } from 'node:os';
import { defineConfig, type TestProjectInlineConfiguration } from 'vitest/config';
import { mockingFiles } from './tests/support/mocking-files.ts';
import { TestOrder } from './tests/support/test-order.ts';

/** No test is timed: a busy machine may take its time, a hung test must end. */
const PATIENCE = 180_000;

/**
 * The tests of a part of the application. Its files keep nothing from one to the next and share what they
 * import, which takes longer than most of them; those that put something in a module's place run alone.
 */
function sharedAndAlone(
  name: 'server' | 'client',
  test: TestProjectInlineConfiguration['test'],
): TestProjectInlineConfiguration[] {
  const alone = mockingFiles(`tests/${name}`);
  const include = [`tests/${name}/**/*.test.{ts,tsx}`];
  return [
    { test: { ...test, name: `${name}-alone`, include: alone } },
    { test: { ...test, name, include, exclude: alone, isolate: false } },
  ];
}

export default defineConfig({
  test: {
    // one worker a processor; without this one would be left idle
    maxWorkers: availableParallelism(),
    sequence: { sequencer: TestOrder },
    // in this order: whole applications wait much of the time, while the rest keeps the processors busy
    projects: [
      {
        test: {
          name: 'start',
          include: ['tests/scripts/start/**/*.test.ts'],
          globalSetup: ['tests/support/build-setup.ts'],
          testTimeout: PATIENCE,
          hookTimeout: PATIENCE,
        },
      },
      {
        test: {
          name: 'scripts',
          include: ['tests/scripts/**/*.test.ts'],
          exclude: ['tests/scripts/start/**'],
          testTimeout: PATIENCE,
        },
      },
      ...['verification', 'shared', 'architecture'].map((name) => ({
        test: {
          name,
          include: [`tests/${name}/**/*.test.ts`],
          isolate: false,
          testTimeout: PATIENCE,
        },
      })),
      ...sharedAndAlone('server', {
        globalSetup: ['tests/support/database-setup.ts'],
        testTimeout: PATIENCE,
        hookTimeout: PATIENCE,
      }),
      ...sharedAndAlone('client', {
        environment: 'jsdom',
        setupFiles: ['tests/support/client-setup.ts'],
        testTimeout: PATIENCE,
        hookTimeout: PATIENCE,
      }),
      {
        // once the rest has left the machine to them; each worker has an application of its own
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          isolate: false,
          globalSetup: ['tests/support/browser-setup.ts'],
          maxWorkers: Math.min(2, availableParallelism()),
          sequence: { groupOrder: 1 },
          // a browser that stalls on a busy machine says nothing of the product; a second go is printed
          retry: 1,
          testTimeout: 2 * PATIENCE,
          hookTimeout: 2 * PATIENCE,
        },
      },
    ],
  },
});
