import { immutable, type Migration } from '../migration.ts';

/**
 * Letters to parties. Templates and settings are versions that never change. A batch is prepared by one
 * person and checked by another; its letters are what they were when it was prepared. What goes out by mail
 * stands in the outbox first: a try is written down before the mail server is spoken to, so that after a
 * stop it is known which letters may be with it already.
 */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table letter_settings (
        scheme_id uuid not null references schemes,
        version integer not null,
        settings jsonb not null,
        created_by uuid references people,
        created_at timestamptz not null default now(),
        primary key (scheme_id, version)
      );
      create table letter_templates (
        scheme_id uuid not null references schemes,
        kind text not null,
        version integer not null,
        subject text not null,
        body text not null,
        created_by uuid references people,
        created_at timestamptz not null default now(),
        primary key (scheme_id, kind, version)
      );
      create table letter_batches (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        number integer not null,
        kind text not null,
        template_version integer not null,
        settings_version integer not null,
        run_id uuid references runs,
        letters integer not null,
        prepared_by uuid not null references people,
        prepared_at timestamptz not null default now(),
        state text not null default 'waiting for check' check (state in
          ('waiting for check', 'returned', 'withdrawn', 'checked', 'sent')),
        checked_by uuid references people,
        checked_at timestamptz,
        comment text,
        sent_by uuid references people,
        sent_at timestamptz,
        unique (scheme_id, number),
        constraint nobody_checks_their_own_letters check (checked_by <> prepared_by),
        check ((checked_by is null) = (state in ('waiting for check', 'withdrawn'))),
        check ((checked_by is null) = (checked_at is null)),
        check ((sent_at is not null) = (state = 'sent'))
      );
      create function refuse_batch_change() returns trigger language plpgsql as $$
      begin
        if (new.id, new.scheme_id, new.number, new.kind, new.template_version, new.settings_version,
            new.run_id, new.letters, new.prepared_by, new.prepared_at)
          is distinct from
           (old.id, old.scheme_id, old.number, old.kind, old.template_version, old.settings_version,
            old.run_id, old.letters, old.prepared_by, old.prepared_at)
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
      create trigger letter_batches_move_on before update on letter_batches
        for each row execute function refuse_batch_change();
      revoke delete, truncate on letter_batches from ${server};
      create trigger letter_batches_refuse_delete before delete on letter_batches
        for each row execute function refuse_change();
      create trigger letter_batches_refuse_truncate before truncate on letter_batches
        for each statement execute function refuse_change();
      create table letters (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        batch_id uuid not null references letter_batches,
        number integer not null,
        party_id uuid not null references parties,
        channel text not null check (channel in ('e-mail', 'post')),
        name text not null,
        address text not null,
        email text,
        subject text not null,
        body text not null,
        facts jsonb not null,
        reasons jsonb not null,
        answer_by date,
        unique (batch_id, number),
        check (channel = 'post' or email is not null)
      );
      create index letters_of_party on letters (party_id);
      create table letter_buildings (
        letter_id uuid not null references letters,
        building_id integer not null references buildings,
        primary key (letter_id, building_id)
      );
      create index letters_of_building on letter_buildings (building_id);
      create table letter_exceptions (
        batch_id uuid not null references letter_batches,
        party_id uuid not null references parties,
        reasons jsonb not null,
        why text not null,
        primary key (batch_id, party_id)
      );
      create table letter_printings (
        batch_id uuid primary key references letter_batches,
        printed_by uuid not null references people,
        printed_at timestamptz not null default now()
      );
      create table letter_acknowledgements (
        letter_id uuid primary key references letters,
        acknowledged_at timestamptz not null default now(),
        by_person uuid not null references people,
        how text not null
      );
      create table outbox (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        letter_id uuid references letters,
        recipient text not null,
        subject text not null,
        parts jsonb not null,
        link_id uuid references single_use_links,
        calendar text,
        is_reminder boolean not null default false,
        put_in_at timestamptz not null default now(),
        state text not null default 'waiting' check (state in ('waiting', 'sent', 'failed')),
        was_sent_again boolean not null default false,
        refusals integer not null default 0,
        next_try_at timestamptz not null default now(),
        server_words text,
        ended_at timestamptz,
        check ((ended_at is null) = (state = 'waiting'))
      );
      create unique index outbox_of_letter on outbox (letter_id) where not is_reminder;
      create unique index outbox_reminders on outbox (letter_id) where is_reminder;
      create index outbox_waiting on outbox (next_try_at) where state = 'waiting';
      create table outbox_tries (
        mail_id uuid not null references outbox,
        number integer not null,
        begun_at timestamptz not null default now(),
        primary key (mail_id, number)
      );
      create table outbox_answers (
        mail_id uuid not null,
        number integer not null,
        answered_at timestamptz not null default now(),
        was_accepted boolean not null,
        words text not null,
        primary key (mail_id, number),
        foreign key (mail_id, number) references outbox_tries
      );
      ${[
        'letter_settings',
        'letter_templates',
        'letters',
        'letter_buildings',
        'letter_exceptions',
        'letter_printings',
        'letter_acknowledgements',
        'outbox_tries',
        'outbox_answers',
      ]
        .map((table) => immutable(table, server))
        .join('\n')}
      alter table mailbox_letters add column attachments jsonb not null default '[]';
      -- a mail is called for once at most, however often somebody calls for it
      select pgboss.create_queue('outbox', json_build_object(
        'policy', 'short',
        'retryLimit', 20,
        'expireInSeconds', 120
      ));
      grant select, insert, update, delete on all tables in schema pgboss to ${server};
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      select pgboss.delete_queue('outbox');
      alter table mailbox_letters drop column attachments;
      drop table outbox_answers;
      drop table outbox_tries;
      drop table outbox;
      drop table letter_acknowledgements;
      drop table letter_printings;
      drop table letter_exceptions;
      drop table letter_buildings;
      drop table letters;
      drop table letter_batches;
      drop function refuse_batch_change();
      drop table letter_templates;
      drop table letter_settings;
    `);
  },
};
