import { AppError } from '../errors.ts';
import { stopPrint } from '../models/prints.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { keptPrint } from './kept-print.ts';
import { recordChange } from './record-change.ts';

/** Stops a print for good, whether it waits or is being drawn; nothing of it stays on the disk. */
export async function cancelPrint(
  { database, jobs }: Pick<Services, 'database' | 'jobs'>,
  by: Actor,
  scheme: Scheme,
  id: string,
): Promise<void> {
  await keptPrint(database, scheme.id, id);
  await jobs.stop(id);
  await database.transaction(async (transaction) => {
    if (!(await stopPrint(database, id, transaction))) {
      throw new AppError('conflict', 'This print has ended already.');
    }
    const subject = { kind: 'print', id };
    await recordChange({ by, schemeId: scheme.id, action: 'cancel print', subject }, transaction);
  });
}
