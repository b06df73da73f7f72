import { findRunOrder } from '../models/find-run-rows.ts';
import { packedIds, type PackedIds } from '../register/packed-ids.ts';
import type { Services } from '../services.ts';

/** The buildings of a run by the references that it took, kept as tiles are: a run never takes others. */
export async function runOrder(
  { database, tiles }: Pick<Services, 'database' | 'tiles'>,
  runId: string,
): Promise<PackedIds> {
  return packedIds(await tiles.get(`run/${runId}`, () => findRunOrder(database, runId)));
}
