import path from 'node:path';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const server = `http://127.0.0.1:${process.env.PORT ?? 4600}`;

/** No test is timed: a busy machine may take its time, a hung test must end. */
const PATIENCE = 60_000;

export default defineConfig({
  plugins: [react(), tailwindcss()],
  worker: { format: 'es' },
  build: {
    outDir: path.resolve(import.meta.dirname, 'dist/client'),
    copyPublicDir: false,
    target: 'es2022',
    sourcemap: true,
    // the map library is one part of 1.2 MB, fetched when a plan is first opened
    chunkSizeWarningLimit: 1300,
  },
  server: { port: 4601, proxy: { '/api': server, '/tiles': server } },
  test: {
    projects: [
      {
        // pure code keeps nothing from file to file, so files may share what they import
        test: {
          name: 'shared',
          include: ['tests/shared/**/*.test.ts'],
          isolate: false,
          testTimeout: PATIENCE,
        },
      },
      {
        test: {
          name: 'verification',
          include: ['tests/verification/**/*.test.ts'],
          isolate: false,
          testTimeout: PATIENCE,
        },
      },
      {
        test: {
          name: 'architecture',
          include: ['tests/architecture/**/*.test.ts'],
          isolate: false,
          testTimeout: PATIENCE,
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
      {
        test: {
          name: 'server',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: ['tests/support/database-setup.ts'],
          testTimeout: PATIENCE,
          hookTimeout: PATIENCE,
        },
      },
      {
        test: {
          name: 'client',
          include: ['tests/client/**/*.test.{ts,tsx}'],
          environment: 'jsdom',
          setupFiles: ['tests/support/client-setup.ts'],
          testTimeout: PATIENCE,
          hookTimeout: PATIENCE,
        },
      },
      {
        // whole applications, one at a time, once the rest has left the machine to them
        test: {
          name: 'start',
          include: ['tests/scripts/start/**/*.test.ts'],
          fileParallelism: false,
          sequence: { groupOrder: 1 },
          testTimeout: PATIENCE,
          hookTimeout: PATIENCE,
        },
      },
      {
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: ['tests/support/browser-setup.ts'],
          fileParallelism: false,
          sequence: { groupOrder: 2 },
          testTimeout: 120_000,
          hookTimeout: 120_000,
        },
      },
    ],
  },
});
