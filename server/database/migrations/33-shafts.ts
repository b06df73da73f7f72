import type { Migration } from '../migration.ts';

/** Shafts stand beside the design of an option: no run takes them. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`alter table alignments add column shafts jsonb not null default '[]'`);
  },
  down: async ({ sql }) => {
    await sql(`alter table alignments drop column shafts`);
  },
};
