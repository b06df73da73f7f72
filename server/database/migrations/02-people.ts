import type { Migration } from '../migration.ts';

export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table people (
        id uuid primary key,
        email text not null,
        name text not null,
        password_hash text,
        is_administrator boolean not null default false,
        sessions_valid_from timestamptz not null default now(),
        created_at timestamptz not null default now()
      );
      create unique index people_email on people (lower(email));
      create table sessions (
        sid text primary key,
        sess json not null,
        expire timestamptz not null
      );
      create index sessions_expire on sessions (expire);
      create table single_use_links (
        id uuid primary key,
        person_id uuid not null references people,
        purpose text not null check (purpose in ('invitation', 'password-reset')),
        token_hash text not null unique,
        expires_at timestamptz not null,
        used_at timestamptz
      );
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table single_use_links, sessions, people');
  },
};
