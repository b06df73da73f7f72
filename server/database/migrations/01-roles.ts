import type { Migration } from '../migration.ts';

/** The serving role reads and writes what the owner makes, and makes nothing itself. */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      revoke create on schema public from public;
      do $$ begin
        execute format('revoke temporary on database %I from public', current_database());
      end $$;
      grant usage on schema public to ${server};
      alter default privileges in schema public
        grant select, insert, update, delete on tables to ${server};
      alter default privileges in schema public
        grant usage, select on sequences to ${server};
      create function refuse_change() returns trigger language plpgsql as $$
      begin
        raise exception 'rows of % are never changed', tg_table_name using errcode = 'restrict_violation';
      end $$;
    `);
  },
  down: async ({ sql, server }) => {
    await sql(`
      drop function refuse_change();
      alter default privileges in schema public
        revoke usage, select on sequences from ${server};
      alter default privileges in schema public
        revoke select, insert, update, delete on tables from ${server};
      revoke usage on schema public from ${server};
      do $$ begin
        execute format('grant temporary on database %I to public', current_database());
      end $$;
    `);
  },
};
