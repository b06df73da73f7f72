import { crsOfScheme } from '../crs/crs-of-scheme.ts';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { findRunOrder, findRunRows, type RunRow } from '../models/find-run-rows.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Services } from '../services.ts';
import type { ExportedRow } from './export-file.ts';

const AT_ONCE = 1000;

/** The buildings of a run one after the other by reference, read a thousand at a time. */
export async function* exportedRun(
  { database }: Pick<Services, 'database'>,
  scheme: Scheme,
  runId: string,
  isDrawn: boolean,
): AsyncGenerator<ExportedRow<RunRow>> {
  const [{ definition }, order] = await Promise.all([
    crsOfScheme(scheme),
    findRunOrder(database, runId),
  ]);
  const place = toLonLat(definition);
  for (let from = 0; from < order.length; from += AT_ONCE) {
    const ids = order.slice(from, from + AT_ONCE);
    for (const row of await findRunRows(database, { runId, ids, isDrawn })) {
      const lonLat = row.parts?.map((part) => part.map((ring) => ring.map(place)));
      yield { reference: row.facts.reference, row, lonLat };
    }
  }
}
