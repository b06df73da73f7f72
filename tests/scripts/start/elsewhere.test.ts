import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createDataFolder } from '../../support/data-folder.ts';
import { runScript, startApp, stopApp } from '../../support/running-app.ts';
import { startThrowAwayCluster } from '../../support/throw-away-cluster.ts';

const { folder, remove } = createDataFolder('elsewhere');
let cluster: Awaited<ReturnType<typeof startThrowAwayCluster>>;
let urls: { DATABASE_URL: string; MIGRATE_URL: string };

/** Nobody takes letters in there. */
const WITHOUT_DEMO = { DEMO: 'false', SMTP_URL: 'smtp://127.0.0.1:1' };

beforeAll(async () => {
  cluster = await startThrowAwayCluster();
  cluster.ensureDatabase('elsewhere');
  const DATABASE_URL = cluster.serverUrl('elsewhere');
  urls = { DATABASE_URL, MIGRATE_URL: cluster.ownerUrl('elsewhere') };
});
afterAll(() => {
  cluster.remove();
  remove();
});

async function refusal(more: NodeJS.ProcessEnv): Promise<string> {
  const DATA_DIR = path.join(folder, 'refused');
  const run = runScript('start', [], { ...urls, DATA_DIR, PORT: '0', ...WITHOUT_DEMO, ...more });
  expect(await run.ended).toBe(1);
  expect(run.output()).not.toMatch(/^ {4}at /m);
  return run.output();
}

// in this order: the database is empty until it is migrated
describe('npm start with a database elsewhere', () => {
  it.each([
    ['nothing answers', { DATABASE_URL: 'postgres://a:b@127.0.0.1:1/c' }, 'No PostgreSQL answers'],
    ['it is no address', { DATABASE_URL: 'mysql://a:b@127.0.0.1/c' }, 'is no address'],
    ['there are no tables', { MIGRATE_URL: undefined }, 'Set MIGRATE_URL'],
  ])('says what to do where %s', async (_what, more, sentence) => {
    expect(await refusal(more)).toContain(sentence);
  });

  it('says what to do where the password, role, database or owner is wrong', async () => {
    const { DATABASE_URL, MIGRATE_URL } = urls;
    const wrong = new URL(DATABASE_URL);
    wrong.password = 'wrong';
    expect(await refusal({ DATABASE_URL: wrong.href })).toContain('the password is wrong, or');
    const away = cluster.serverUrl('away');
    expect(await refusal({ DATABASE_URL: away })).toContain('There is no database "away"');
    const one = await refusal({ DATABASE_URL: MIGRATE_URL });
    expect(one).toContain('must be another one');
    const turned = await refusal({ DATABASE_URL: MIGRATE_URL, MIGRATE_URL: DATABASE_URL });
    expect(turned).toContain('may not make tables');
  });

  it('says how the first administrator is named', async () => {
    expect(await refusal({})).toContain('FIRST_ADMINISTRATOR=name@your.domain');
  });

  it('serves, and prints where the first administrator chooses a password', async () => {
    const more = { ...urls, ...WITHOUT_DEMO, FIRST_ADMINISTRATOR: 'chief@example.org' };
    const app = await startApp(folder, more);
    const [, url = ''] = /^ {2}(http\S+)$/m.exec(app.output()) ?? [];
    const link = await fetch(url.replace('/links/', '/api/links/'));
    expect(await link.json()).toMatchObject({ email: 'chief@example.org', name: 'Administrator' });
    expect(await stopApp(app)).toBe(0);
  });
});
