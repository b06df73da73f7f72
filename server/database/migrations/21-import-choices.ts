import type { Migration } from '../migration.ts';

/**
 * What else an import tells: the layers of its file, which is kept while another can be chosen, and from
 * which earlier file its columns are remembered.
 */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      alter table imports
        add column layers jsonb not null default '[]',
        add column file text,
        add column remembered jsonb,
        drop column is_remembered;
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      alter table imports
        add column is_remembered boolean not null default false,
        drop column remembered,
        drop column file,
        drop column layers;
    `);
  },
};
