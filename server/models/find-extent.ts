import { QueryTypes, type Sequelize } from 'sequelize';
import type { LonLatBox } from './find-buildings-in-box.ts';

type Row = { bounds: LonLatBox | null };

const BOUNDS = `case when count(*) > 0
  then array[min(west), min(south), max(east), max(north)] end as bounds`;

/** What is drawn of a scheme, the best first. */
const DRAWN = {
  buildings: `select ${BOUNDS} from buildings where scheme_id = $1 and removed_at is null`,
  background: `select ${BOUNDS} from background_features where scheme_id = $1`,
} as const;

/** Round a scheme's buildings, else round its background; undefined where it has neither. */
export async function findExtent(
  database: Sequelize,
  schemeId: string,
): Promise<{ bounds: LonLatBox; from: 'buildings' | 'background' } | undefined> {
  for (const from of ['buildings', 'background'] as const) {
    const [row] = await database.query<Row>(DRAWN[from], {
      type: QueryTypes.SELECT,
      bind: [schemeId],
    });
    if (row?.bounds) return { bounds: row.bounds, from };
  }
  return undefined;
}
