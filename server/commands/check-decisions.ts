import type { z } from 'zod';
import type { checkDecisionsSchema, decisionsDoneSchema } from '../../shared/schemas/decisions.ts';
import { mayCheck, waitingForCheck } from '../decisions/waiting-for-check.ts';
import { AppError } from '../errors.ts';
import { closeDecisions } from '../models/decisions.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { settleDecisions, VERDICT_ACTIONS } from './settle-decisions.ts';

/**
 * Checks or returns every decision that waits on the buildings that are meant and that somebody else
 * prepared: as many as the person was told, or none.
 */
export async function checkDecisions(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { filter, verdict, comment, expected }: z.infer<typeof checkDecisionsSchema>,
): Promise<z.infer<typeof decisionsDoneSchema>> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const { optionId, waiting } = await waitingForCheck(database, scheme.id, filter, transaction);
    const open = waiting.filter((decision) => mayCheck(decision, by));
    if (open.length !== expected || optionId === null) {
      const message = `${open.length} decisions wait for you here now, not ${expected}. Look at them again.`;
      throw new AppError('conflict', message);
    }
    const ids = open.map(({ id }) => id);
    await closeDecisions(database, ids, { state: verdict, by: by.id, comment }, transaction);
    const action = VERDICT_ACTIONS[verdict];
    const settled = { by, scheme, optionId, decisions: open, action, after: { comment } };
    await settleDecisions(database, settled, transaction);
    return { batchId: null, count: open.length };
  });
}
