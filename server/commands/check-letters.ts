import type { z } from 'zod';
import type { checkBatchSchema } from '../../shared/schemas/letter-batches.ts';
import { AppError } from '../errors.ts';
import { writeCheck } from '../models/letter-batches.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readBatchAs } from './kept-batch.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

type Check = z.infer<typeof checkBatchSchema> & { readonly batchId: string };

/** Checks a batch of letters or returns it; nobody their own. */
export async function checkLetters(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { batchId, verdict, comment }: Check,
): Promise<void> {
  await database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const batch = await readBatchAs(database, scheme.id, batchId, 'waiting for check', transaction);
    if (batch.preparedById === by.id) {
      throw new AppError('not-allowed', 'You prepared these letters. Somebody else checks them.');
    }
    await writeCheck(database, batchId, { state: verdict, by: by.id, comment }, transaction);
    const subject = { kind: 'letters', id: batchId };
    const action = verdict === 'checked' ? 'check letters' : 'return letters';
    const after = { state: verdict, comment };
    await recordChange({ by, schemeId: scheme.id, action, subject, after }, transaction);
  });
}
