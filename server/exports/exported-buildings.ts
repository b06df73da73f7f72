import { findLonLat } from '../models/footprints.ts';
import { findRows } from '../models/find-register-rows.ts';
import type { PackedIds } from '../register/register-order.ts';
import type { Services } from '../services.ts';
import type { ExportedBuilding } from './export-job.ts';

const AT_ONCE = 1000;

/** The buildings of an order one after the other, read a thousand at a time. */
export async function* exportedBuildings(
  { database }: Pick<Services, 'database'>,
  order: PackedIds,
  isDrawn: boolean,
): AsyncGenerator<ExportedBuilding> {
  for (let from = 0; from < order.count; from += AT_ONCE) {
    const ids = order.slice(from, from + AT_ONCE);
    const [rows, drawn] = await Promise.all([
      findRows(database, ids),
      isDrawn ? findLonLat(database, ids) : undefined,
    ]);
    for (const building of rows) yield { building, lonLat: drawn?.get(building.id) };
  }
}
