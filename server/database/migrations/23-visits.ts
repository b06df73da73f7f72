import { immutable, type Migration } from '../migration.ts';

/**
 * Visits of buildings, numbered by the phone that records them; what was put right in the register is a
 * change of it. Photographs are told of with the visit; their files arrive one by one.
 */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table visits (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        building_id integer not null references buildings,
        visited_at timestamptz not null,
        visited_by uuid not null references people,
        part text not null check (part in ('inside', 'outside', 'inside and outside')),
        condition text,
        construction text,
        notes text not null,
        defects jsonb not null,
        change_id uuid references register_changes,
        fingerprint text not null,
        recorded_at timestamptz not null default now()
      );
      create index visits_building on visits (building_id, visited_at desc);
      create index visits_scheme on visits (scheme_id, visited_at desc);
      create table visit_photographs (
        id uuid primary key,
        visit_id uuid not null references visits,
        number smallint not null,
        caption text not null,
        taken_at timestamptz,
        width integer,
        height integer,
        keeps_place boolean not null,
        longitude double precision check (longitude is null or keeps_place),
        latitude double precision check (latitude is null or keeps_place),
        unique (visit_id, number)
      );
      create table visit_photograph_files (
        photograph_id uuid primary key references visit_photographs,
        sha256 text not null,
        type text not null check (type in ('image/jpeg', 'image/png', 'image/webp')),
        bytes integer not null,
        received_at timestamptz not null default now()
      );
      ${['visits', 'visit_photographs', 'visit_photograph_files']
        .map((table) => immutable(table, server))
        .join('\n')}
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop table visit_photograph_files;
      drop table visit_photographs;
      drop table visits;
    `);
  },
};
