import type { Migration } from '../migration.ts';

export const migration: Migration = {
  up: async ({ sql }) => {
    await sql('alter table people add column shut_out_at timestamptz');
  },
  down: async ({ sql }) => {
    await sql('alter table people drop column shut_out_at');
  },
};
