import { immutable, type Migration } from '../migration.ts';

/**
 * Parties: who owns, rents or manages buildings, and what interest they have in which. What a party was
 * before is kept until its personal data are erased; a party that was merged into another stays as a pointer.
 */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table parties (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        kind text not null check (kind in ('person', 'organisation')),
        name text not null,
        address text not null,
        email text,
        channel text not null check (channel in ('e-mail', 'post')),
        represented_by uuid references parties,
        person_id uuid references people,
        version integer not null default 1,
        created_at timestamptz not null default now(),
        changed_at timestamptz not null default now(),
        merged_into uuid references parties,
        erased_at timestamptz,
        words tsvector not null generated always as (
          folded_words(name || ' ' || address || ' ' || coalesce(email, ''))
        ) stored,
        check (channel = 'post' or email is not null),
        check (represented_by <> id),
        check (merged_into <> id),
        check (erased_at is null or (name = '' and address = '' and email is null))
      );
      create index parties_of_scheme on parties (scheme_id, name collate natural_order);
      create index parties_of_person on parties (person_id);
      create table interests (
        id uuid primary key,
        party_id uuid not null references parties,
        building_id integer not null references buildings,
        kind text not null check (kind in ('freeholder', 'leaseholder', 'tenant', 'manager')),
        from_day date,
        to_day date,
        check (from_day <= to_day)
      );
      create index interests_of_party on interests (party_id);
      create index interests_of_building on interests (building_id);
      create table party_changes (
        id bigint generated always as identity primary key,
        party_id uuid not null references parties,
        changed_at timestamptz not null default now(),
        changed_by uuid references people,
        action text not null,
        before jsonb,
        after jsonb
      );
      create index party_changes_of_party on party_changes (party_id, id);
      create table party_imports (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        file_name text not null,
        state text not null check (state in ('checked', 'taken over', 'given up')),
        columns jsonb not null,
        rows jsonb,
        counts jsonb not null,
        sent_by uuid not null references people,
        sent_at timestamptz not null default now(),
        ended_at timestamptz
      );
      create table party_erasures (
        party_id uuid primary key references parties,
        ground text not null,
        asked_on date not null,
        erased_by uuid not null references people,
        erased_at timestamptz not null default now()
      );
      ${immutable('party_erasures', server)}
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop table party_erasures;
      drop table party_imports;
      drop table party_changes;
      drop table interests;
      drop table parties;
    `);
  },
};
