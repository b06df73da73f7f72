/**
 * The party that stands today for one that a row names: the one that it was merged into, through others too.
 * Read as `cross join lateral (…)`.
 */
export function standingParty(column: string): string {
  return `
    with recursive followed as (
      select * from parties where id = ${column}
      union all select next.* from parties next join followed f on next.id = f.merged_into
    ) select * from followed where merged_into is null`;
}
