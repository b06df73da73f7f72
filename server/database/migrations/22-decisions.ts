import type { Migration } from '../migration.ts';

/**
 * Decisions on buildings, each on one run: prepared by one assessor, checked by another. What was prepared
 * never changes; a decision only moves on, and whoever prepared it can never be who checked it. Marks say
 * what of a live decision's basis has changed since. Standings are where each building stands for an
 * option, kept so that lists need not work it out.
 */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      alter table schemes add column decisions_version integer not null default 1;
      create table decisions (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        alignment_id uuid not null,
        run_id uuid not null,
        building_id integer not null,
        building_version integer not null,
        rules_version integer not null,
        kind text not null check (kind in ('let go at stage 1', 'let go at stage 2', 'go to stage 3',
          'adopt a category', 'protective measures', 'no measures')),
        category smallint check (category between 0 and 4),
        reason text not null,
        basis jsonb not null,
        batch_id uuid not null,
        prepared_by uuid not null references people,
        prepared_at timestamptz not null default now(),
        state text not null default 'waiting for check' check (state in
          ('waiting for check', 'returned', 'withdrawn', 'checked', 'superseded')),
        checked_by uuid references people,
        checked_at timestamptz,
        comment text,
        superseded_by uuid references decisions,
        foreign key (run_id, building_id) references run_results,
        check ((category is not null) = (kind = 'adopt a category')),
        constraint nobody_checks_their_own check (checked_by <> prepared_by),
        check ((checked_by is null) = (state in ('waiting for check', 'withdrawn'))),
        check ((checked_by is null) = (checked_at is null)),
        check ((superseded_by is not null) = (state = 'superseded'))
      );
      create unique index decisions_waiting on decisions (alignment_id, building_id)
        where state = 'waiting for check';
      create unique index decisions_in_force on decisions (alignment_id, building_id)
        where state = 'checked';
      create index decisions_of_building on decisions (building_id, prepared_at);
      create index decisions_of_batch on decisions (batch_id);
      create function refuse_decision_change() returns trigger language plpgsql as $$
      begin
        if (new.id, new.scheme_id, new.alignment_id, new.run_id, new.building_id, new.building_version,
            new.rules_version, new.kind, new.category, new.reason, new.basis, new.batch_id,
            new.prepared_by, new.prepared_at)
          is distinct from
           (old.id, old.scheme_id, old.alignment_id, old.run_id, old.building_id, old.building_version,
            old.rules_version, old.kind, old.category, old.reason, old.basis, old.batch_id,
            old.prepared_by, old.prepared_at)
        then raise exception 'what was prepared never changes';
        end if;
        if old.state = 'waiting for check' and new.state in ('returned', 'withdrawn', 'checked')
        then return new;
        end if;
        if old.state = 'checked' and new.state = 'superseded'
          and (new.checked_by, new.checked_at, new.comment)
            is not distinct from (old.checked_by, old.checked_at, old.comment)
        then return new;
        end if;
        raise exception 'a decision that was % stays so', old.state;
      end $$;
      create trigger decisions_move_on before update on decisions
        for each row execute function refuse_decision_change();
      revoke delete, truncate on decisions from ${server};
      create trigger decisions_refuse_delete before delete on decisions
        for each row execute function refuse_change();
      create trigger decisions_refuse_truncate before truncate on decisions
        for each statement execute function refuse_change();
      create table decision_marks (
        decision_id uuid primary key references decisions,
        run_id uuid not null references runs,
        rules_version integer not null,
        changes jsonb not null,
        found_at timestamptz not null default now()
      );
      create table building_standings (
        alignment_id uuid not null,
        building_id integer not null references buildings,
        state text not null,
        kind text not null,
        decision_id uuid not null references decisions,
        prepared_by uuid not null references people,
        primary key (alignment_id, building_id)
      );
      create table building_assignments (
        building_id integer primary key references buildings,
        person_id uuid not null references people,
        given_by uuid not null references people,
        given_at timestamptz not null default now()
      );
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop table building_assignments;
      drop table building_standings;
      drop table decision_marks;
      drop table decisions;
      drop function refuse_decision_change();
      alter table schemes drop column decisions_version;
    `);
  },
};
