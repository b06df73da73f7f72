import { immutable, type Migration } from '../migration.ts';

/** What was done to a register, and to which buildings of it: each building's history, and the way back. */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table register_changes (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        at timestamptz not null default now(),
        person_id uuid references people,
        kind text not null,
        source text,
        import_id uuid,
        undoes uuid references register_changes
      );
      create unique index register_changes_undone on register_changes (undoes);
      create index register_changes_scheme on register_changes (scheme_id, at desc);
      create index register_changes_import on register_changes (import_id) where import_id is not null;
      create table building_changes (
        change_id uuid not null references register_changes,
        building_id integer not null references buildings,
        version integer not null,
        before jsonb,
        after jsonb,
        primary key (change_id, building_id)
      );
      create index building_changes_building on building_changes (building_id);
      ${immutable('register_changes', server)}
      ${immutable('building_changes', server)}
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table building_changes; drop table register_changes;');
  },
};
