import { crsOfScheme } from '../crs/crs-of-scheme.ts';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { findRunRows, type RunRow } from '../models/find-run-rows.ts';
import type { Scheme } from '../models/scheme.ts';
import { inThousands } from '../register/packed-ids.ts';
import { runOrder } from '../runs/run-order.ts';
import type { Services } from '../services.ts';
import type { ExportedRow } from './export-file.ts';

/** The buildings of a run one after the other by reference, read a thousand at a time. */
export async function* exportedRun(
  services: Pick<Services, 'database' | 'tiles'>,
  scheme: Scheme,
  runId: string,
  isDrawn: boolean,
): AsyncGenerator<ExportedRow<RunRow>> {
  const [{ definition }, order] = await Promise.all([
    crsOfScheme(scheme),
    runOrder(services, runId),
  ]);
  const place = toLonLat(definition);
  for (const ids of inThousands(order)) {
    for (const row of await findRunRows(services.database, { runId, ids, isDrawn })) {
      const lonLat = row.parts?.map((part) => part.map((ring) => ring.map(place)));
      yield { reference: row.facts.reference, row, lonLat };
    }
  }
}
