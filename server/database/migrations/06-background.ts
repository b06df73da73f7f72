import type { Migration } from '../migration.ts';

export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table background_features (
        id integer generated always as identity primary key,
        scheme_id uuid not null references schemes,
        layer text not null check (layer in ('streets', 'water', 'rail', 'parks')),
        name text,
        geometry jsonb not null,
        west double precision not null,
        south double precision not null,
        east double precision not null,
        north double precision not null
      );
      create index background_features_box on background_features
        using gist (box(point(west, south), point(east, north)));
      create index background_features_scheme on background_features (scheme_id, layer);
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table background_features');
  },
};
