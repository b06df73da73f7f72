import type { Migration } from '../migration.ts';

/** What a print may come to while it is worked on; all else of it is what was asked for. */
const PROGRESS = ['state', 'done', 'sheets', 'fault', 'bytes', 'fingerprint'];

/**
 * Evidence on paper: named layouts, and prints of runs. What was asked of a print never changes, and one
 * that has ended never changes at all.
 */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table plan_layouts (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        name text not null,
        layout jsonb not null,
        version integer not null default 1,
        changed_at timestamptz not null default now(),
        changed_by uuid references people
      );
      create unique index plan_layouts_name
        on plan_layouts (scheme_id, lower(name collate "und-x-icu"));
      create table prints (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        run_id uuid not null references runs,
        number integer not null,
        name text not null,
        layout jsonb not null,
        asked_at timestamptz not null default now(),
        asked_by uuid references people,
        state text not null default 'waiting'
          check (state in ('waiting', 'printing', 'done', 'cancelled', 'failed')),
        done integer not null default 0,
        sheets integer,
        fault text,
        bytes integer,
        fingerprint text check (fingerprint ~ '^[0-9a-f]{64}$'),
        unique (scheme_id, number),
        check ((fingerprint is not null) = (state = 'done')),
        check ((bytes is not null) = (state = 'done')),
        check ((fault is not null) = (state = 'failed'))
      );
      create function refuse_print_change() returns trigger language plpgsql as $$
      begin
        if tg_op = 'UPDATE' and old.state in ('waiting', 'printing')
          and (new.id, new.scheme_id, new.run_id, new.number, new.name, new.layout, new.asked_at,
            new.asked_by)
          is not distinct from (old.id, old.scheme_id, old.run_id, old.number, old.name, old.layout,
            old.asked_at, old.asked_by)
        then return new;
        end if;
        raise exception 'what was asked of a print, and one that has ended, is never changed'
          using errcode = 'restrict_violation';
      end $$;
      create trigger prints_refuse_change before update or delete on prints
        for each row execute function refuse_print_change();
      create trigger prints_refuse_truncate before truncate on prints
        for each statement execute function refuse_change();
      revoke update, delete, truncate on prints from ${server};
      grant update (${PROGRESS.join(', ')}) on prints to ${server};
      -- what a run took to stand somewhere is sought where it stood then
      create index building_snapshots_box
        on building_snapshots using gist (box(point(west, south), point(east, north)));
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop index building_snapshots_box;
      drop table prints;
      drop function refuse_print_change();
      drop table plan_layouts;
    `);
  },
};
