import type { Migration } from '../migration.ts';

/** What protects buildings, at the tunnel, in the ground or at the building; every change is in the trail. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table measures (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        kind text not null check (kind in ('at the tunnel', 'in the ground', 'at the building')),
        title text not null,
        detail text not null,
        state text not null
          check (state in ('proposed', 'agreed', 'in place', 'done', 'given up')),
        responsible text not null,
        due date,
        loss_limit jsonb,
        version integer not null default 1,
        created_by uuid not null references people,
        changed_at timestamptz not null default now(),
        check (loss_limit is null or kind = 'at the tunnel')
      );
      create index measures_of_scheme on measures (scheme_id);
      create table measure_buildings (
        measure_id uuid not null references measures,
        building_id integer not null references buildings,
        primary key (measure_id, building_id)
      );
      create index measures_of_building on measure_buildings (building_id);
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop table measure_buildings;
      drop table measures;
    `);
  },
};
