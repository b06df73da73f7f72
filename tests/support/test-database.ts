import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { inject } from 'vitest';

async function asSuperuser(text: string): Promise<void> {
  const client = new pg.Client(inject('cluster').superUrl.replace('DATABASE', 'postgres'));
  await client.connect();
  await client.query(text);
  await client.end();
}

/** A database of its own for a test file, copied from the migrated template. */
export async function createTestDatabase(): Promise<{
  ownerUrl: string;
  serverUrl: string;
  drop: () => Promise<void>;
}> {
  const name = `test_${randomBytes(6).toString('hex')}`;
  await asSuperuser(`create database ${name} template groundsill_template owner groundsill_owner`);
  const { ownerUrl, serverUrl } = inject('cluster');
  return {
    ownerUrl: ownerUrl.replace('DATABASE', name),
    serverUrl: serverUrl.replace('DATABASE', name),
    drop: () => asSuperuser(`drop database ${name} with (force)`),
  };
}
