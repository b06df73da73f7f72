import { recordChange } from '../commands/record-change.ts';
import { removeKeptLetters } from '../models/remove-kept-letters.ts';
import { Scheme } from '../models/scheme.ts';
import { removeFromFolder } from '../photographs/photograph-folder.ts';
import type { Services } from '../services.ts';

/**
 * Removes letters and what was written of parties whose personal data were erased, once the day has passed
 * that was stated then; gives how many letters and matters that was. The trail says that it was done.
 */
export async function removeKept({
  database,
  env,
}: Pick<Services, 'database' | 'env'>): Promise<number> {
  let count = 0;
  for (const { id: schemeId } of await Scheme.findAll({ order: ['id'] })) {
    const photographs = await database.transaction(async (transaction) => {
      const removed = await removeKeptLetters(database, schemeId, transaction);
      const { letters, matters } = removed;
      count += letters + matters;
      if (letters + matters > 0) {
        const subject = { kind: 'scheme', id: schemeId };
        const action = 'remove kept letters';
        const change = { by: null, schemeId, action, subject, after: { letters, matters } };
        await recordChange(change, transaction);
      }
      return removed.photographs;
    });
    for (const sha256 of photographs) await removeFromFolder(env.PHOTOGRAPHS_FOLDER, sha256);
  }
  return count;
}
