import { AppError } from '../errors.ts';
import { writeWithdrawal } from '../models/letter-batches.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readBatchAs } from './kept-batch.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Takes a batch of letters back before anybody has checked it; only whoever prepared it may. */
export async function withdrawLetters(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  batchId: string,
): Promise<void> {
  await database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const batch = await readBatchAs(database, scheme.id, batchId, 'waiting for check', transaction);
    if (batch.preparedById !== by.id) throw new AppError('not-allowed');
    await writeWithdrawal(database, batchId, transaction);
    const subject = { kind: 'letters', id: batchId };
    const change = { by, schemeId: scheme.id, action: 'withdraw letters', subject };
    await recordChange({ ...change, after: { state: 'withdrawn' } }, transaction);
  });
}
