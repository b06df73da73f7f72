import type { Migration } from '../migration.ts';

/**
 * Invitations and letters for a new password wait in the outbox too. They belong to no scheme, and are always
 * of a single-use link.
 */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      alter table outbox alter column scheme_id drop not null;
      alter table outbox add constraint mails_of_no_scheme_are_of_an_account check (
        scheme_id is not null or (letter_id is null and party_id is null and link_id is not null)
      );
      create index outbox_of_link on outbox (link_id) where link_id is not null;
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      select set_config('groundsill.removes_kept', 'on', true);
      delete from outbox_answers where mail_id in (select id from outbox where scheme_id is null);
      delete from outbox_tries where mail_id in (select id from outbox where scheme_id is null);
      delete from outbox where scheme_id is null;
      select set_config('groundsill.removes_kept', 'off', true);
      drop index outbox_of_link;
      alter table outbox drop constraint mails_of_no_scheme_are_of_an_account;
      alter table outbox alter column scheme_id set not null;
    `);
  },
};
