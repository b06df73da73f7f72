import { immutable, type Migration } from '../migration.ts';

/**
 * What owners bring up and what they are answered, appointments at their buildings, and what has been
 * promised to whom. Messages never change; where a matter stands moves on.
 */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table matters (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        number integer not null,
        kind text not null check (kind in ('question', 'concern', 'claim', 'correction')),
        party_id uuid not null references parties,
        building_id integer not null references buildings,
        letter_id uuid references letters,
        title text not null,
        suggestion jsonb,
        state text not null default 'open' check (state in ('open', 'answered', 'closed')),
        due date not null,
        assigned_to uuid references people,
        version integer not null default 1,
        opened_by uuid not null references people,
        opened_at timestamptz not null default now(),
        changed_at timestamptz not null default now(),
        unique (scheme_id, number),
        check ((suggestion is not null) = (kind = 'correction'))
      );
      create index matters_of_building on matters (building_id);
      create index matters_of_party on matters (party_id);
      create table matter_messages (
        id uuid primary key,
        matter_id uuid not null references matters,
        written_by uuid not null references people,
        side text not null check (side in ('owner', 'team', 'note')),
        text text not null,
        written_at timestamptz not null default now()
      );
      create index messages_of_matter on matter_messages (matter_id, written_at);
      create table matter_photographs (
        id uuid primary key,
        message_id uuid not null references matter_messages,
        number smallint not null,
        caption text not null,
        unique (message_id, number)
      );
      create table matter_photograph_files (
        photograph_id uuid primary key references matter_photographs,
        sha256 text not null,
        type text not null check (type in ('image/jpeg', 'image/png', 'image/webp')),
        bytes integer not null,
        received_at timestamptz not null default now()
      );
      create table appointments (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        building_id integer not null references buildings,
        party_id uuid not null references parties,
        purpose text not null check (purpose in ('condition survey', 'access')),
        starts_at timestamptz not null,
        minutes integer not null check (minutes between 5 and 1440),
        place text not null,
        state text not null default 'offered' check (state in
          ('offered', 'agreed', 'another day asked for', 'cancelled', 'done')),
        asked_for jsonb,
        version integer not null default 1,
        created_by uuid not null references people,
        changed_at timestamptz not null default now()
      );
      create index appointments_of_building on appointments (building_id);
      create table undertakings (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        number integer not null,
        promise text not null,
        made_to text not null,
        party_id uuid references parties,
        source text not null,
        building_id integer references buildings,
        chainage_from double precision,
        chainage_to double precision,
        due date,
        responsible text not null,
        done_on date,
        evidence text not null,
        version integer not null default 1,
        created_by uuid not null references people,
        changed_at timestamptz not null default now(),
        unique (scheme_id, number),
        check ((chainage_from is null) = (chainage_to is null)),
        check (chainage_from <= chainage_to),
        check (building_id is not null or chainage_from is not null),
        check (done_on is null or evidence <> '')
      );
      create index undertakings_due on undertakings (scheme_id, due) where done_on is null;
      ${['matter_messages', 'matter_photographs', 'matter_photograph_files']
        .map((table) => immutable(table, server))
        .join('\n')}
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop table undertakings;
      drop table appointments;
      drop table matter_photograph_files;
      drop table matter_photographs;
      drop table matter_messages;
      drop table matters;
    `);
  },
};
