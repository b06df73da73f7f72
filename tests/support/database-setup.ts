import type { TestProject } from 'vitest/node';
import { openMigrations } from '../../server/database/migrate.ts';
import { startThrowAwayCluster } from './throw-away-cluster.ts';

const TEMPLATE = 'groundsill_template';

/** Starts a throw-away cluster and migrates the database that each test file copies. */
export default async function setUp(project: TestProject): Promise<() => void> {
  const cluster = await startThrowAwayCluster();
  cluster.ensureDatabase(TEMPLATE);
  const migrations = openMigrations(cluster.ownerUrl(TEMPLATE), cluster.serverUrl(TEMPLATE));
  await migrations.up();
  await migrations.close();
  project.provide('cluster', {
    superUrl: cluster.superUrl('DATABASE'),
    ownerUrl: cluster.ownerUrl('DATABASE'),
    serverUrl: cluster.serverUrl('DATABASE'),
  });
  return cluster.remove;
}
