import { insertPrinting } from '../models/letter-batches.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readBatchAs } from './kept-batch.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Records that the letters of a batch that go by post have been printed and handed to it. */
export async function recordPrinting(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  batchId: string,
): Promise<void> {
  await database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const { printedAt, byPost } = await readBatchAs(database, scheme.id, batchId, 'sent', transaction); // prettier-ignore
    if (printedAt !== null) return;
    await insertPrinting(database, batchId, by.id, transaction);
    const subject = { kind: 'letters', id: batchId };
    const change = { by, schemeId: scheme.id, action: 'hand letters to the post', subject };
    await recordChange({ ...change, after: { letters: byPost } }, transaction);
  });
}
