import { immutable, type Migration } from '../migration.ts';

export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table audit_entries (
        id bigint generated always as identity primary key,
        at timestamptz not null default now(),
        person_id uuid references people,
        scheme_id uuid references schemes,
        action text not null,
        subject_kind text not null,
        subject_id text not null,
        before jsonb,
        after jsonb
      );
      create index audit_entries_scheme on audit_entries (scheme_id, id desc);
      ${immutable('audit_entries', server)}
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table audit_entries');
  },
};
