import pg from 'pg';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { openMigrations } from '../../server/database/migrate.ts';
import { createTestDatabase } from '../support/test-database.ts';

let addresses: Awaited<ReturnType<typeof createTestDatabase>>;
let owner: pg.Client;
let server: pg.Client;

async function connected(url: string): Promise<pg.Client> {
  const client = new pg.Client(url);
  await client.connect();
  return client;
}

beforeAll(async () => {
  addresses = await createTestDatabase();
  owner = await connected(addresses.ownerUrl);
  server = await connected(addresses.serverUrl);
});

afterAll(async () => {
  await Promise.all([owner.end(), server.end()]);
  await addresses.drop();
});

/** Everything that migrations make: columns, constraints, indexes, triggers, rights, functions. */
const SHAPE = `
  select 'column' as kind, table_name || '.' || column_name as name,
      concat_ws(' ', data_type, is_nullable, column_default) as detail
    from information_schema.columns where table_schema = 'public'
  union all
  select 'constraint', conrelid::regclass || '.' || conname, pg_get_constraintdef(oid)
    from pg_constraint where connamespace = 'public'::regnamespace
  union all
  select 'index', indexname, indexdef from pg_indexes where schemaname = 'public'
  union all
  select 'trigger', tgrelid::regclass || '.' || tgname, pg_get_triggerdef(oid)
    from pg_trigger where not tgisinternal
  union all
  select 'right', grantee || ' ' || table_name, string_agg(privilege_type, ',' order by privilege_type)
    from information_schema.role_table_grants where table_schema = 'public' group by grantee, table_name
  union all
  select 'function', proname, '' from pg_proc where pronamespace = 'public'::regnamespace
  order by kind, name, detail`;

type Shape = { readonly kind: string; readonly name: string; readonly detail: string };

async function shape(): Promise<Shape[]> {
  return (await owner.query<Shape>(SHAPE)).rows;
}

async function codeOf(client: pg.Client, text: string): Promise<string | undefined> {
  try {
    await client.query(text);
    return undefined;
  } catch (error) {
    if (error instanceof pg.DatabaseError) return error.code;
    throw error;
  }
}

const DENIED = '42501';
const REFUSED = '23001';

describe('migrations', () => {
  test('go down to nothing and up to the same again', async () => {
    const before = await shape();
    const migrations = openMigrations(addresses.ownerUrl, addresses.serverUrl);
    expect(await migrations.up()).toEqual([]);
    const down = await migrations.down();
    const left = (await shape()).filter(({ name }) => !/\bmigrations/.test(name));
    expect(left).toEqual([]);
    const up = await migrations.up();
    await migrations.close();
    expect(up).toEqual([...down].reverse());
    expect(up[0]).toBe('01-roles');
    expect(await shape()).toEqual(before);
  });
});

describe('the role that serves', () => {
  test('is no superuser, owns nothing and makes no role or database', async () => {
    const { rows } = await server.query(
      `select rolsuper, rolcreaterole, rolcreatedb, rolbypassrls, rolreplication,
         (select count(*)::int from pg_class where relowner = r.oid) as owned
       from pg_roles r where rolname = current_user`,
    );
    expect(rows).toEqual([
      {
        rolsuper: false,
        rolcreaterole: false,
        rolcreatedb: false,
        rolbypassrls: false,
        rolreplication: false,
        owned: 0,
      },
    ]);
  });

  test.each([
    'create table other (id int)',
    'create schema other',
    'create view other as select 1',
    'create function other() returns int language sql as $$ select 1 $$',
    'alter table people add column other text',
    'alter table audit_entries disable trigger all',
    'drop trigger audit_entries_refuse_change on audit_entries',
    'drop table people',
    'truncate people cascade',
    'create role other',
    'delete from migrations',
    'set session_replication_role = replica',
  ])('may not %s', async (text) => {
    expect(await codeOf(server, text)).toBe(DENIED);
  });

  test('gives itself no right', async () => {
    await server.query('grant update on audit_entries to current_user');
    expect(await codeOf(server, `update audit_entries set action = 'other'`)).toBe(DENIED);
  });

  test('reads and writes what changes', async () => {
    await server.query(
      `insert into people (id, email, name) values (gen_random_uuid(), 'a@example.org', 'A')`,
    );
    await server.query(`update people set name = 'B' where email = 'a@example.org'`);
    await server.query(`delete from people where email = 'a@example.org'`);
  });
});

describe.each([
  ['audit_entries', `action = 'other'`],
  ['scheme_rules', `rules = '{}'`],
  ['register_changes', `kind = 'other'`],
  ['building_changes', `version = 7`],
  ['building_snapshots', `facts = '[]'`],
  ['runs', `number = 7`],
  ['run_buildings', `version = 7`],
  ['run_contours', `contours = '[1]'`],
  ['run_results', `stage = 3`],
  ['run_orders', `place = 7`],
  ['prints', `name = 'other'`],
  ['visits', `notes = 'other'`],
  ['visit_photographs', `caption = 'other'`],
  ['visit_photograph_files', `bytes = 7`],
])('rows of %s', (table, change) => {
  beforeAll(async () => {
    await owner.query(`
      with person as (
        insert into people (id, email, name)
        values (gen_random_uuid(), gen_random_uuid() || '@example.org', 'A') returning id
      ), scheme as (
        insert into schemes (id, name, crs) values (gen_random_uuid(), gen_random_uuid(), 32631) returning id
      ), entry as (
        insert into audit_entries (action, subject_kind, subject_id) values ('a', 'b', 'c')
      ), building as (
        insert into buildings (scheme_id, reference, west, south, east, north)
        select id, 'A', 0, 0, 0, 0 from scheme returning id
      ), change as (
        insert into register_changes (id, scheme_id, kind)
        select gen_random_uuid(), id, 'draw' from scheme returning id
      ), history as (
        insert into building_changes (change_id, building_id, version)
        select change.id, building.id, 1 from change, building
      ), snapshot as (
        insert into building_snapshots (building_id, version, facts, west, south, east, north)
        select id, 1, '{}', 0, 0, 0, 0 from building returning building_id
      ), run as (
        insert into runs (id, scheme_id, number, alignment_id, alignment_version, option_name, design,
          rules_version, rules, method_version, register_version, buildings)
        select gen_random_uuid(), id, 1, gen_random_uuid(), 1, 'A', '{}', 1, '{}', '1.0.0', 1, 1
        from scheme returning id
      ), member as (
        insert into run_buildings (run_id, building_id, version)
        select run.id, building_id, 1 from run, snapshot returning run_id, building_id
      ), contours as (
        insert into run_contours (run_id, contours) select id, '[]' from run
      ), ordered as (
        insert into run_orders (run_id, result_column, place, ids, words) select id, 'a', 0, '', 'b' from run
      ), result as (
        insert into run_results (run_id, building_id, stage, settlement, slope, held_by, assumed, warnings)
        select run_id, building_id, 1, 0, 0, '{}', '{}', '{}' from member
      ), print as (
        insert into prints (id, scheme_id, run_id, number, name, layout)
        select gen_random_uuid(), scheme.id, run.id, 1, 'A', '{}' from scheme, run
      ), visit as (
        insert into visits (id, scheme_id, building_id, visited_at, visited_by, part, notes, defects,
          fingerprint)
        select gen_random_uuid(), scheme.id, building.id, now(), person.id, 'outside', '', '[]', 'a'
        from scheme, building, person returning id
      ), photograph as (
        insert into visit_photographs (id, visit_id, number, caption, keeps_place)
        select gen_random_uuid(), id, 0, '', false from visit returning id
      ), file as (
        insert into visit_photograph_files (photograph_id, sha256, type, bytes)
        select id, 'a', 'image/png', 1 from photograph
      )
      insert into scheme_rules (scheme_id, version, rules, created_by)
      select scheme.id, 1, '[]', person.id from scheme, person`);
  });

  const CHANGES = [
    `update ${table} set ${change}`,
    `delete from ${table}`,
    `truncate ${table} cascade`,
  ];

  test.each(CHANGES)('the role that serves may not: %s', async (text) => {
    expect(await codeOf(server, text)).toBe(DENIED);
  });

  test.each(CHANGES)('a trigger refuses the owner as well: %s', async (text) => {
    expect(await codeOf(owner, text)).toBe(REFUSED);
  });
});

test('tables of other migrations are not forgotten here', async () => {
  const { rows } = await owner.query<{ name: string }>(
    `select distinct tgrelid::regclass::text as name from pg_trigger
     where tgname like '%_refuse_change' order by name`,
  );
  expect(rows.map(({ name }) => name)).toEqual([
    'audit_entries',
    'building_changes',
    'building_snapshots',
    'letter_acknowledgements',
    'letter_buildings',
    'letter_exceptions',
    'letter_printings',
    'letter_settings',
    'letter_templates',
    'letters',
    'matter_messages',
    'matter_photograph_files',
    'matter_photographs',
    'outbox_answers',
    'outbox_tries',
    'party_erasures',
    'prints',
    'register_changes',
    'run_buildings',
    'run_contours',
    'run_orders',
    'run_results',
    'runs',
    'scheme_rules',
    'visit_photograph_files',
    'visit_photographs',
    'visits',
  ]);
});
