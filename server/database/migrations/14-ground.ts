import type { Migration } from '../migration.ts';

/** Where a scheme's ground levels come from: one level, points, or a grid, as they were given. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table scheme_grounds (
        scheme_id uuid primary key references schemes,
        kind text not null,
        source text not null,
        person_id uuid references people,
        at timestamptz not null default now(),
        points integer not null,
        lowest double precision not null,
        highest double precision not null,
        content bytea not null
      );
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table scheme_grounds');
  },
};
