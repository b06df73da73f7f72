import type { Migration } from '../migration.ts';

/** Letters of the demo. Elsewhere the table stays empty. */
export const migration: Migration = {
  up: async ({ sql }) => {
    await sql(`
      create table mailbox_letters (
        id integer generated always as identity primary key,
        message_id text not null unique,
        received_at timestamptz not null default now(),
        sender text not null,
        recipient text not null,
        subject text not null,
        text text not null,
        html text
      );
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table mailbox_letters');
  },
};
