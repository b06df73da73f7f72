import { AppError } from '../errors.ts';
import { keepAcknowledgement } from '../models/keep-acknowledgement.ts';
import { findLetters } from '../models/letters.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Records that a letter was acknowledged by telephone, on paper or in another way. Twice is once. */
export async function recordAcknowledgement(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { letterId, how }: { readonly letterId: string; readonly how: string },
): Promise<void> {
  await database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const [letter] = await findLetters(database, scheme.id, { letterId }, transaction);
    if (letter === undefined) throw new AppError('not-found');
    if (letter.sentAt === null) {
      throw new AppError('invalid-input', 'This letter has not been sent yet.');
    }
    if (!(await keepAcknowledgement(database, { letterId, by: by.id, how }, transaction))) return;
    const subject = { kind: 'letter', id: letterId };
    const change = { by, schemeId: scheme.id, action: 'acknowledge letter', subject };
    await recordChange({ ...change, after: { how } }, transaction);
  });
}
