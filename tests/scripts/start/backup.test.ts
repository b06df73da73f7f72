import { existsSync, statSync, truncateSync } from 'node:fs';
import path from 'node:path';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openMigrations } from '../../../server/database/migrate.ts';
import { createDataFolder } from '../../support/data-folder.ts';
import { runScript } from '../../support/running-app.ts';
import { startThrowAwayCluster } from '../../support/throw-away-cluster.ts';

const { folder, remove } = createDataFolder('backup');
const file = path.join(folder, 'town.dump');
let cluster: Awaited<ReturnType<typeof startThrowAwayCluster>>;

function names(database = 'groundsill'): string[] {
  return cluster.sql(database, 'select name from people order by name').trim().split('\n');
}

function addPerson(name: string): void {
  const values = `gen_random_uuid(), '${name}@example.org', '${name}'`;
  cluster.sql('groundsill', `insert into people (id, email, name) values (${values})`);
}

async function run(script: string, args: string[], database = 'groundsill') {
  const MIGRATE_URL = cluster.ownerUrl(database);
  const done = runScript(script, args, { DATA_DIR: folder, MIGRATE_URL });
  return { status: await done.ended, output: done.output() };
}

beforeAll(async () => {
  cluster = await startThrowAwayCluster();
  cluster.ensureDatabase('groundsill');
  const migrations = openMigrations(
    cluster.ownerUrl('groundsill'),
    cluster.serverUrl('groundsill'),
  );
  await migrations.up();
  await migrations.close();
  addPerson('before');
  cluster.sql('groundsill', `insert into sessions values ('id', '{}', now())`);
});

afterAll(() => {
  cluster.remove();
  remove();
});

describe('npm run backup', () => {
  it('writes a file that only its owner may read, and never over another', async () => {
    expect(await run('backup', [file])).toMatchObject({ status: 0 });
    expect(statSync(file).mode & 0o077).toBe(0);
    const again = await run('backup', [file]);
    expect(again).toMatchObject({ status: 1 });
    expect(again.output).toContain('is there already');
  });

  it('leaves nothing where it fails', async () => {
    const nowhere = path.join(folder, 'nowhere.dump');
    expect(await run('backup', [nowhere], 'unheard-of')).toMatchObject({ status: 1 });
    expect(existsSync(nowhere)).toBe(false);
  });
});

describe('npm run restore', () => {
  it('refuses to give up data unasked', async () => {
    addPerson('later');
    const refused = await run('restore', [file]);
    expect(refused).toMatchObject({ status: 1 });
    expect(refused.output).toContain('add --replace');
    expect(names()).toEqual(['before', 'later']);
  });

  it('puts back what was in the file, without sessions, in place of what is there', async () => {
    expect(await run('restore', [file, '--replace'])).toMatchObject({ status: 0 });
    expect(names()).toEqual(['before']);
    expect(cluster.sql('groundsill', 'select count(*) from sessions').trim()).toBe('0');
  });

  it('fills an empty database, with the rights of the role that serves', async () => {
    cluster.ensureDatabase('empty');
    expect(await run('restore', [file], 'empty')).toMatchObject({ status: 0 });
    expect(names('empty')).toEqual(['before']);
    function may(right: string, table: string): string {
      const query = `select has_table_privilege('groundsill_server', '${table}', '${right}')`;
      return cluster.sql('empty', query).trim();
    }
    expect([may('insert', 'audit_entries'), may('update', 'audit_entries')]).toEqual(['t', 'f']);
    const temporary = `select has_database_privilege('groundsill_server', 'empty', 'temporary')`;
    expect(cluster.sql('empty', temporary).trim()).toBe('f');
    const owner = cluster.sql(
      'empty',
      `select tableowner from pg_tables where tablename = 'people'`,
    );
    expect(owner.trim()).toBe('groundsill_owner');
  });

  it('leaves everything standing while somebody is at work in it', async () => {
    const somebody = new pg.Client(cluster.serverUrl('groundsill'));
    await somebody.connect();
    const failed = await run('restore', [file, '--replace']);
    await somebody.end();
    expect(failed).toMatchObject({ status: 1 });
    expect(failed.output).toContain('being accessed by other users');
    expect(cluster.sql('postgres', 'select datname from pg_database')).not.toContain('_re');
    expect(names()).toEqual(['before']);
  });

  it('leaves everything standing where the file is cut short', async () => {
    addPerson('since');
    truncateSync(file, statSync(file).size - 500);
    const failed = await run('restore', [file, '--replace']);
    expect(failed).toMatchObject({ status: 1 });
    expect(failed.output).toContain('The database stands as it was.');
    expect(names()).toEqual(['before', 'since']);
    expect(cluster.sql('postgres', 'select datname from pg_database')).not.toContain('_re');
  });
});
