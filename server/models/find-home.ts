import { QueryTypes, type Sequelize } from 'sequelize';
import type { LonLatBox } from './find-buildings-in-box.ts';

/** Across so many degrees of latitude buildings can be made out even on a small map; about two kilometres. */
const WIDE = 0.02;
/** What share lies far away where nearly all lie together. */
const STRAYS = 0.02;
/** Half of what is shown of several towns; less than a kilometre. */
const AROUND = 0.0075;
const RADIANS = Math.PI / 180;

type Drawn = { readonly bounds: LonLatBox; readonly from: 'buildings' | 'background' };

const OF_SCHEME = 'from buildings where scheme_id = $1 and removed_at is null';

/** Round all buildings but strays. */
const NEARLY_ALL = `select array[
    percentile_disc(${STRAYS}) within group (order by west),
    percentile_disc(${STRAYS}) within group (order by south),
    percentile_disc(${1 - STRAYS}) within group (order by east),
    percentile_disc(${1 - STRAYS}) within group (order by north)
  ] as box ${OF_SCHEME}`;

/** Round the middle of the buildings where they are most, by cells of a grid. */
const DENSEST = `select array[
    avg(west) - $2, avg(south) - ${AROUND}, avg(west) + $2, avg(south) + ${AROUND}
  ] as box ${OF_SCHEME}
  group by floor(west / $2), floor(south / ${AROUND})
  order by count(*) desc limit 1`;

function narrowing([, south, , north]: LonLatBox): number {
  return Math.cos(((south + north) / 2) * RADIANS);
}

function isWide(box: LonLatBox): boolean {
  const [west, south, east, north] = box;
  return Math.max((east - west) * narrowing(box), north - south) > WIDE;
}

/**
 * What a map shows of a scheme at first: all of its buildings, or where some lie too far away for any to
 * be made out, nearly all; of several towns the densest.
 */
export async function findHome(
  database: Sequelize,
  schemeId: string,
  { bounds, from }: Drawn,
): Promise<LonLatBox> {
  async function boxOf(sql: string, ...more: readonly number[]): Promise<LonLatBox> {
    const [row] = await database.query<{ box: LonLatBox }>(sql, {
      type: QueryTypes.SELECT,
      bind: [schemeId, ...more],
    });
    return row?.box ?? bounds;
  }
  if (from === 'background' || !isWide(bounds)) return bounds;
  const nearlyAll = await boxOf(NEARLY_ALL);
  return isWide(nearlyAll) ? boxOf(DENSEST, AROUND / narrowing(bounds)) : nearlyAll;
}
