import { immutable, type Migration } from '../migration.ts';

export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table schemes (
        id uuid primary key,
        name text not null,
        description text not null default '',
        crs integer not null,
        archived_at timestamptz,
        version integer not null default 1,
        register_version integer not null default 1,
        background_version integer not null default 1,
        created_at timestamptz not null default now()
      );
      create table memberships (
        scheme_id uuid not null references schemes,
        person_id uuid not null references people,
        role text not null check (role in ('designer', 'assessor', 'owner', 'witness')),
        primary key (scheme_id, person_id, role)
      );
      create index memberships_person on memberships (person_id);
      create table scheme_rules (
        scheme_id uuid not null references schemes,
        version integer not null,
        rules jsonb not null,
        created_by uuid not null references people,
        created_at timestamptz not null default now(),
        primary key (scheme_id, version)
      );
      ${immutable('scheme_rules', server)}
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table scheme_rules, memberships, schemes');
  },
};
