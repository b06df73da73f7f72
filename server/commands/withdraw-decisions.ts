import type { z } from 'zod';
import type {
  decisionsDoneSchema,
  withdrawDecisionsSchema,
} from '../../shared/schemas/decisions.ts';
import { waitingForCheck } from '../decisions/waiting-for-check.ts';
import { AppError } from '../errors.ts';
import { withdrawWaiting } from '../models/decisions.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { settleDecisions } from './settle-decisions.ts';

/** Takes back what a person prepared and nobody has checked yet, on the buildings that are meant. */
export async function withdrawDecisions(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { filter, expected }: z.infer<typeof withdrawDecisionsSchema>,
): Promise<z.infer<typeof decisionsDoneSchema>> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const { optionId, waiting } = await waitingForCheck(database, scheme.id, filter, transaction);
    const own = waiting.filter(({ preparedBy }) => preparedBy === by.id);
    if (own.length !== expected || optionId === null) {
      const message = `${own.length} decisions of yours wait here now, not ${expected}. Look at them again.`;
      throw new AppError('conflict', message);
    }
    await withdrawWaiting(
      database,
      own.map(({ id }) => id),
      transaction,
    );
    const action = 'withdraw decisions';
    await settleDecisions(database, { by, scheme, optionId, decisions: own, action }, transaction);
    return { batchId: null, count: own.length };
  });
}
