import type { Migration } from '../migration.ts';

/** Footprints stand apart, so that lists of buildings are read without them. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table building_footprints (
        building_id integer primary key references buildings,
        footprint jsonb not null,
        lon_lat jsonb not null
      );
      insert into building_footprints select id, footprint, lon_lat from buildings;
      alter table buildings drop column footprint, drop column lon_lat;
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      alter table buildings add column footprint jsonb, add column lon_lat jsonb;
      update buildings set footprint = given.footprint, lon_lat = given.lon_lat
        from building_footprints as given where building_id = id;
      alter table buildings
        alter column footprint set not null, alter column lon_lat set not null;
      drop table building_footprints;
    `);
  },
};
