import type { Migration } from '../migration.ts';

/** Views of a register that somebody keeps. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table register_views (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        person_id uuid not null references people,
        name text not null,
        filter jsonb not null,
        sort jsonb not null,
        columns jsonb not null,
        unique (scheme_id, person_id, name)
      );
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table register_views');
  },
};
