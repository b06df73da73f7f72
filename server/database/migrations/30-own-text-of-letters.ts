import type { Migration } from '../migration.ts';

/** What a batch says never changes; `own` names the columns that have come since batches were made. */
function refusal(own: readonly string[]): string {
  const columns = [
    ...['id', 'scheme_id', 'number', 'kind', 'template_version', 'settings_version', 'run_id'],
    ...['letters', 'prepared_by', 'prepared_at'],
    ...own,
  ];
  const row = (which: string) => columns.map((column) => `${which}.${column}`).join(', ');
  return `
    create or replace function refuse_batch_change() returns trigger language plpgsql as $$
    begin
      if (${row('new')}) is distinct from (${row('old')})
      then raise exception 'what was prepared never changes';
      end if;
      if old.state = 'waiting for check' and new.state in ('returned', 'withdrawn', 'checked')
      then return new;
      end if;
      if old.state = 'checked' and new.state = 'sent'
        and (new.checked_by, new.checked_at, new.comment)
          is not distinct from (old.checked_by, old.checked_at, old.comment)
      then return new;
      end if;
      raise exception 'letters that were % stay so', old.state;
    end $$;
  `;
}

/** Letters of free text are written for their batch, and the batch keeps what was written, with its marks. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      alter table letter_batches add column own_subject text, add column own_body text,
        add constraint own_text_is_free check (
          (own_subject is null) = (own_body is null) and (own_subject is null or kind = 'free text')
        );
      ${refusal(['own_subject', 'own_body'])}
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      ${refusal([])}
      alter table letter_batches drop column own_subject, drop column own_body;
    `);
  },
};
