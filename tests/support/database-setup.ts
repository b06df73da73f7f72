import path from 'node:path';
import type { TestProject } from 'vitest/node';
import { startCluster } from '../../scripts/postgres/cluster.mjs';
import { openMigrations } from '../../server/database/migrate.ts';

export const TEMPLATE = 'groundsill_template';

declare module 'vitest' {
  interface ProvidedContext {
    /** Addresses of the throw-away cluster, with DATABASE where the name of the database goes. */
    cluster: { superUrl: string; ownerUrl: string; serverUrl: string };
  }
}

/** Starts a throw-away cluster and migrates the database that each test file copies. */
export default async function setUp(project: TestProject): Promise<() => void> {
  const home = path.resolve(import.meta.dirname, '../../.data/postgres-test');
  const cluster = await startCluster({ home, fast: true });
  cluster.sql('postgres', `drop database if exists ${TEMPLATE} with (force)`);
  cluster.ensureDatabase(TEMPLATE);
  const migrations = openMigrations(cluster.ownerUrl(TEMPLATE), cluster.serverUrl(TEMPLATE));
  await migrations.up();
  await migrations.close();
  project.provide('cluster', {
    superUrl: cluster.superUrl('DATABASE'),
    ownerUrl: cluster.ownerUrl('DATABASE'),
    serverUrl: cluster.serverUrl('DATABASE'),
  });
  return () => {
    cluster.stop();
  };
}
