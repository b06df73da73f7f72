import type { Migration } from '../migration.ts';

/**
 * The words that a building is found by: small letters without accents, split where neither letters nor
 * figures stand. The database keeps them, so that no change of a building can leave them behind.
 */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(String.raw`
      create function folded_words(given text) returns tsvector
        language sql immutable strict parallel safe
        return array_to_tsvector(array_remove(regexp_split_to_array(
          lower(regexp_replace(normalize(given, nfd), '[\u0300-\u036f]+', '', 'g')),
          '[^[:alnum:]]+'), ''));
      alter table buildings add column words tsvector not null generated always as (
        folded_words(reference || ' ' || coalesce(name, '') || ' ' || coalesce(address, ''))
      ) stored;
      create index buildings_words on buildings using gin (words);
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      alter table buildings drop column words;
      drop function folded_words;
    `);
  },
};
