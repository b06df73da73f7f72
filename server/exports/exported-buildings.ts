import { findLonLat } from '../models/footprints.ts';
import { findRows } from '../models/find-register-rows.ts';
import type { ListedBuilding } from '../presenters/building-values.ts';
import type { Register } from '../register/register-of.ts';
import type { PackedIds } from '../register/register-order.ts';
import type { Services } from '../services.ts';
import type { ExportedRow } from './export-file.ts';

const AT_ONCE = 1000;

/** The buildings of an order one after the other, read a thousand at a time. */
export async function* exportedBuildings(
  { database }: Pick<Services, 'database'>,
  register: Register,
  order: PackedIds,
  isDrawn: boolean,
): AsyncGenerator<ExportedRow<ListedBuilding>> {
  for (let from = 0; from < order.count; from += AT_ONCE) {
    const ids = order.slice(from, from + AT_ONCE);
    const [rows, drawn] = await Promise.all([
      findRows(database, register, ids),
      isDrawn ? findLonLat(database, ids) : undefined,
    ]);
    for (const row of rows) yield { reference: row.reference, row, lonLat: drawn?.get(row.id) };
  }
}
