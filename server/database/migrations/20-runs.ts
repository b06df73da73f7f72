import { immutable, type Migration } from '../migration.ts';

/**
 * Runs: what was put in, never changed, and what was found. Buildings as they were at some version are kept
 * once for all runs. Where a run stands, and which parts of it are done, are the only things that move.
 */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table building_snapshots (
        building_id integer not null references buildings,
        version integer not null,
        facts jsonb not null,
        west double precision not null,
        south double precision not null,
        east double precision not null,
        north double precision not null,
        primary key (building_id, version)
      );
      create table runs (
        id uuid primary key,
        scheme_id uuid not null references schemes,
        number integer not null,
        alignment_id uuid not null,
        alignment_version integer not null,
        option_name text not null,
        design jsonb not null,
        rules_version integer not null,
        rules jsonb not null,
        method_version text not null,
        register_version integer not null,
        buildings integer not null,
        started_at timestamptz not null default now(),
        started_by uuid references people,
        unique (scheme_id, number)
      );
      create table run_buildings (
        run_id uuid not null references runs,
        building_id integer not null,
        version integer not null,
        primary key (run_id, building_id),
        foreign key (building_id, version) references building_snapshots
      );
      create table run_states (
        run_id uuid primary key references runs,
        state text not null
          check (state in ('planning', 'running', 'complete', 'cancelled', 'failed')),
        ended_at timestamptz,
        fault text
      );
      create table run_chunks (
        run_id uuid not null references runs,
        chunk integer not null,
        members integer[] not null,
        beside integer[] not null,
        done_at timestamptz,
        primary key (run_id, chunk)
      );
      create table run_contours (
        run_id uuid primary key references runs,
        contours jsonb not null
      );
      create table run_results (
        run_id uuid not null,
        building_id integer not null,
        stage smallint not null,
        settlement double precision not null,
        slope double precision not null,
        strain_low double precision,
        strain double precision,
        strain_high double precision,
        category_low smallint,
        category smallint,
        category_high smallint,
        rankin text,
        wall_settlement double precision,
        wall_slope double precision,
        breakpoint double precision,
        breakpoint_volume_loss double precision,
        reserve double precision,
        reserve_over_high double precision,
        is_settled boolean,
        sensitive_to text,
        governing_wall text,
        is_row boolean,
        mode text,
        deflection_ratio double precision,
        horizontal_strain double precision,
        held_by text[] not null,
        assumed text[] not null,
        warnings text[] not null,
        fault text,
        primary key (run_id, building_id),
        foreign key (run_id, building_id) references run_buildings
      );
      ${['building_snapshots', 'runs', 'run_buildings', 'run_contours', 'run_results']
        .map((table) => immutable(table, server))
        .join('\n')}
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop table run_results;
      drop table run_contours;
      drop table run_chunks;
      drop table run_states;
      drop table run_buildings;
      drop table runs;
      drop table building_snapshots;
    `);
  },
};
