import type { Migration } from '../migration.ts';

/** Files of buildings on their way into a register: read into rows, checked, then taken over or dropped. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table imports (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        person_id uuid references people,
        at timestamptz not null default now(),
        version integer not null default 1,
        state text not null,
        file_name text not null,
        format text,
        kind text,
        layer text,
        done integer not null default 0,
        of integer,
        columns jsonb not null default '[]',
        options jsonb not null,
        said jsonb,
        is_remembered boolean not null default false,
        place jsonb,
        counts jsonb,
        bounds jsonb,
        missing jsonb not null default '[]',
        fault text,
        change_id uuid references register_changes
      );
      create index imports_scheme on imports (scheme_id, at desc);
      create table import_rows (
        import_id uuid not null references imports on delete cascade,
        row integer not null,
        geometry jsonb,
        fault text,
        properties jsonb not null,
        reference text,
        outcome text,
        remarks jsonb not null default '[]',
        taking jsonb,
        changes jsonb not null default '[]',
        footprint jsonb,
        lon_lat jsonb,
        area double precision,
        west double precision,
        south double precision,
        east double precision,
        north double precision,
        is_mended boolean not null default false,
        building_id integer,
        primary key (import_id, row)
      );
      create index import_rows_box on import_rows using gist (box(point(west, south), point(east, north)))
        where west is not null;
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table import_rows; drop table imports;');
  },
};
