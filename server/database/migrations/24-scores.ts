import type { Migration } from '../migration.ts';

const NUMBERS = ['structure_score', 'features_score'];
const TEXTS = ['structure_reason', 'features_reason'];

/** What makes a building sensitive, in its register; and where each stands along the line, in a run. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      alter table buildings
        add column structure_score smallint check (structure_score between 0 and 2),
        add column structure_reason text,
        add column features_score smallint check (features_score between 0 and 2),
        add column features_reason text;
      ${[...NUMBERS, ...TEXTS.map((text) => `${text} collate natural_order`)]
        .map(
          (column) => `create index buildings_by_${column.split(' ')[0] ?? ''} on buildings
            (scheme_id, ${column}) where removed_at is null;`,
        )
        .join('\n')}
      alter table run_results
        add column chainage double precision,
        add column line_offset double precision;
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      alter table run_results drop column chainage, drop column line_offset;
      alter table buildings ${[...NUMBERS, ...TEXTS].map((column) => `drop column ${column}`).join(', ')};
    `);
  },
};
