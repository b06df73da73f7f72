import type { Migration } from '../migration.ts';

/** Numbers of the register that it is ordered by. */
const NUMBERS = [
  ...['area', 'storeys', 'eaves_height', 'ground_level', 'founding_level', 'e_over_g', 'poisson'],
];
/** Texts that few buildings share, compared as people count; all of them are read from the index alone. */
const OWN_TEXTS = ['name', 'address'];
const SHARED_TEXTS = [
  ...['use', 'foundation', 'construction', 'listed_grade', 'condition', 'inspected'],
];

function index(column: string, more = ''): string {
  return `create index buildings_by_${column} on buildings (scheme_id, ${column}${more})
    where removed_at is null;`;
}

/**
 * Every column of the register in order, so that the ends of it are found without looking at all of it.
 * What is alike is ordered by the index of references, which keeps these small.
 */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      drop index buildings_by_name, buildings_by_address;
      ${NUMBERS.map((column) => index(column)).join('\n')}
      ${SHARED_TEXTS.map((column) => index(column, ' collate natural_order')).join('\n')}
      ${OWN_TEXTS.map((column) => index(column, ' collate natural_order, id')).join('\n')}
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop index ${[...NUMBERS, ...SHARED_TEXTS, ...OWN_TEXTS].map((column) => `buildings_by_${column}`).join(', ')};
      create index buildings_by_name on buildings
        (scheme_id, name collate natural_order, reference collate natural_order, id)
        where removed_at is null;
      create index buildings_by_address on buildings
        (scheme_id, address collate natural_order, reference collate natural_order, id)
        where removed_at is null;
    `);
  },
};
