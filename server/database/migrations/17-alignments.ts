import type { Migration } from '../migration.ts';

/** Options for the line of a scheme, as they are designed. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table alignments (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        name text not null,
        version integer not null default 1,
        design jsonb not null,
        changed_at timestamptz not null default now(),
        changed_by uuid references people
      );
      create unique index alignments_name on alignments (scheme_id, lower(name collate "und-x-icu"));
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table alignments');
  },
};
