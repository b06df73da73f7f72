import { immutable, type Migration } from '../migration.ts';

/** A figure of `r` as the register shows it; of what could not be worked out the record holds nought. */
function worked(figure: string): string {
  return `case when r.fault is null then ${figure} end`;
}

const FIGURES = {
  stage: 'r.stage',
  chainage: 'r.chainage',
  offset: 'r.line_offset',
  categoryLow: worked('r.category_low'),
  category: worked('r.category'),
  categoryHigh: worked('r.category_high'),
  strain: worked('r.strain * 100'),
  settlement: worked('r.settlement * 1000'),
  slope: worked('r.slope * 1000'),
  breakpoint: worked('r.breakpoint'),
  reserve: worked('r.reserve'),
};

const WORDS = {
  settled: `case when r.is_settled then 'settled' when not r.is_settled then 'sensitive' end`,
  heldBy: `nullif(array_to_string(r.held_by, ', '), '')`,
};

/** What complete runs have found, where the register has shown it without this table so far. */
function found(value: string): string {
  return `(
    select r.run_id, r.building_id as id, ${value} as value
    from run_results r join run_states s on s.run_id = r.run_id and s.state = 'complete'
  ) as found where value is not null`;
}

function figuresInOrder([column, figure]: readonly [string, string]): string {
  return `insert into run_orders (run_id, result_column, place, ids, figures)
    select run_id, '${column}', 0, string_agg(int4send(id), ''), string_agg(float8send(value), '')
    from (select * from ${found(figure)} order by run_id, value) as ordered
    group by run_id;`;
}

function wordsInOrder([column, words]: readonly [string, string]): string {
  return `insert into run_orders (run_id, result_column, place, ids, words)
    select run_id, '${column}',
      row_number() over (partition by run_id order by value collate natural_order) - 1, ids, value
    from (
      select run_id, value, string_agg(int4send(id), '') as ids
      from ${found(words)} group by run_id, value
    ) as alike;`;
}

/**
 * What a complete run found, column by column, ascending: the numbers of its buildings, four bytes each, and
 * beside them either a figure each, eight bytes, or the words that they share, a row each.
 */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      create table run_orders (
        run_id uuid not null references runs,
        result_column text not null,
        place integer not null,
        ids bytea not null,
        figures bytea,
        words text,
        primary key (run_id, result_column, place),
        check ((figures is null) = (words is not null)),
        check (octet_length(figures) = 2 * octet_length(ids))
      );
      ${Object.entries(FIGURES).map(figuresInOrder).join('\n')}
      ${Object.entries(WORDS).map(wordsInOrder).join('\n')}
      ${immutable('run_orders', server)}
    `);
  },
  down: async ({ sql }) => {
    await sql('drop table run_orders;');
  },
};
