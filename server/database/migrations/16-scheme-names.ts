import type { Migration } from '../migration.ts';

export const migration: Migration = {
  up: async ({ sql }) => {
    // of schemes that have one name already, the later ones are told apart by their id
    await sql(`
      update schemes set name = left(name, 190) || ' ' || left(id::text, 8)
      where archived_at is null and exists (
        select 1 from schemes earlier
        where earlier.archived_at is null
          and lower(earlier.name collate "und-x-icu") = lower(schemes.name collate "und-x-icu")
          and (earlier.created_at, earlier.id) < (schemes.created_at, schemes.id)
      );
      create unique index schemes_name on schemes (lower(name collate "und-x-icu"))
        where archived_at is null;
    `);
  },
  down: async ({ sql }) => {
    await sql('drop index schemes_name');
  },
};
