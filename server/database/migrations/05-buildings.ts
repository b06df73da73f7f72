import type { Migration } from '../migration.ts';

export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table buildings (
        id integer generated always as identity primary key,
        scheme_id uuid not null references schemes,
        reference text not null,
        name text,
        address text,
        use text,
        storeys integer,
        eaves_height double precision,
        ground_level double precision,
        founding_level double precision,
        foundation text,
        construction text,
        listed_grade text,
        condition text,
        footprint jsonb not null,
        lon_lat jsonb not null,
        west double precision not null,
        south double precision not null,
        east double precision not null,
        north double precision not null,
        unique (scheme_id, reference)
      );
      create index buildings_box on buildings using gist (box(point(west, south), point(east, north)));
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table buildings');
  },
};
