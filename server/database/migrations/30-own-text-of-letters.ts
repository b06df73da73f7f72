import type { Migration } from '../migration.ts';

/** Letters of free text are written for their batch, and the batch keeps what was written, with its marks. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      alter table letter_batches add column own_subject text, add column own_body text,
        add constraint own_text_is_free check (
          (own_subject is null) = (own_body is null) and (own_subject is null or kind = 'free text')
        );
      create function refuse_own_text_change() returns trigger language plpgsql as $$
      begin
        raise exception 'what was prepared never changes';
      end $$;
      create trigger letter_batches_keep_own_text before update on letter_batches
        for each row when (
          (new.own_subject, new.own_body) is distinct from (old.own_subject, old.own_body)
        ) execute function refuse_own_text_change();
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop trigger letter_batches_keep_own_text on letter_batches;
      drop function refuse_own_text_change();
      alter table letter_batches drop column own_subject, drop column own_body;
    `);
  },
};
