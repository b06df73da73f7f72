import type { Migration } from '../migration.ts';

/**
 * What the register keeps of a building besides: its stiffness where it is known, whether somebody was
 * inside, its area, the version that an editor saw, what the last file said, and when it was taken out.
 */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create collation natural_order (provider = icu, locale = 'und-u-kn-true');
      alter table buildings
        add column e_over_g double precision,
        add column poisson double precision,
        add column inspected text,
        add column area double precision not null default 0,
        add column ground_level_from text,
        add column version integer not null default 1,
        add column imported jsonb not null default '{}',
        add column removed_at timestamptz,
        drop constraint buildings_scheme_id_reference_key;
      create unique index buildings_reference on buildings (scheme_id, reference)
        where removed_at is null;
      create index buildings_removed on buildings (scheme_id, reference)
        where removed_at is not null;
      create index buildings_order on buildings (scheme_id, reference collate natural_order, id)
        where removed_at is null;
      create index buildings_by_name on buildings
        (scheme_id, name collate natural_order, reference collate natural_order, id)
        where removed_at is null;
      create index buildings_by_address on buildings
        (scheme_id, address collate natural_order, reference collate natural_order, id)
        where removed_at is null;
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop index buildings_by_address;
      drop index buildings_by_name;
      drop index buildings_order;
      drop index buildings_removed;
      drop index buildings_reference;
      alter table buildings
        add unique (scheme_id, reference),
        drop column removed_at,
        drop column imported,
        drop column version,
        drop column ground_level_from,
        drop column area,
        drop column inspected,
        drop column poisson,
        drop column e_over_g;
      drop collation natural_order;
    `);
  },
};
