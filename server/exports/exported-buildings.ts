import { findLonLat } from '../models/footprints.ts';
import { findRows } from '../models/find-register-rows.ts';
import type { ListedBuilding } from '../presenters/building-values.ts';
import { inThousands, type PackedIds } from '../register/packed-ids.ts';
import type { Register } from '../register/register-of.ts';
import type { Services } from '../services.ts';
import type { ExportedRow } from './export-file.ts';

/** The buildings of an order one after the other, read a thousand at a time. */
export async function* exportedBuildings(
  { database }: Pick<Services, 'database'>,
  register: Register,
  order: PackedIds,
  isDrawn: boolean,
): AsyncGenerator<ExportedRow<ListedBuilding>> {
  for (const ids of inThousands(order)) {
    const [rows, drawn] = await Promise.all([
      findRows(database, register, ids),
      isDrawn ? findLonLat(database, ids) : undefined,
    ]);
    for (const row of rows) yield { reference: row.reference, row, lonLat: drawn?.get(row.id) };
  }
}
