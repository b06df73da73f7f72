import { createOverlapSearch, MOST_OVERLAPS, type Overlap, type OverlapSearch } from '../imports/find-overlaps.ts'; // prettier-ignore
import type { FootprintStore } from '../imports/footprint-store.ts';
import { REMARKS } from '../imports/remarks.ts';
import type { StandingBuildings } from '../imports/standing-buildings.ts';
import { addRemarks } from '../models/checked-rows.ts';
import { findIdsInBox, findOutlines } from '../models/find-outlines.ts';
import type { RegisterImport } from '../models/register-import.ts';
import type { JobTools } from './job.ts';

const AT_ONCE = 2000;

/** Rows that lie over buildings of the register that stay as they are, read part by part. */
async function overRegister(
  { database, signal }: JobTools,
  schemeId: string,
  search: OverlapSearch,
  standing: StandingBuildings,
): Promise<Overlap<string>[]> {
  const box = standing.box();
  if (box === undefined) return [];
  const found: Overlap<string>[] = [];
  const ids = (await findIdsInBox(database, schemeId, box)).filter(standing.stands);
  for (let from = 0; from < ids.length && found.length < MOST_OVERLAPS; from += AT_ONCE) {
    signal.throwIfAborted();
    for (const one of await findOutlines(database, ids.slice(from, from + AT_ONCE))) {
      const isOwn = (row: number) => standing.isAbout(row, one.id);
      found.push(...search.over(one.footprint, one.reference, isOwn));
    }
  }
  return found.slice(0, MOST_OVERLAPS);
}

/** Notes which rows of an import lie over each other, and over buildings of the register. */
export async function noteOverlaps(
  tools: JobTools,
  { id, schemeId }: RegisterImport,
  footprints: FootprintStore,
  standing: StandingBuildings,
): Promise<void> {
  const search = createOverlapSearch(footprints.all);
  const within = search.within().map(({ row, other, area }) => {
    return { row, remark: REMARKS.overlap(other, area) };
  });
  const over = (await overRegister(tools, schemeId, search, standing)).map(
    ({ row, other, area }) => ({ row, remark: REMARKS.overlapRegister(other, area) }),
  );
  const remarks = [...within, ...over];
  if (remarks.length > 0) await addRemarks(tools.database, id, remarks);
}
