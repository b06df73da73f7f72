import type { z } from 'zod';
import type { checkDecisionSchema } from '../../shared/schemas/decisions.ts';
import { AppError } from '../errors.ts';
import { closeDecisions, findDecision } from '../models/decisions.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { settleDecisions, VERDICT_ACTIONS } from './settle-decisions.ts';

/** Checks or returns one decision that somebody else prepared. One on a changed basis can only be returned. */
export async function checkDecision(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { id, verdict, comment }: z.infer<typeof checkDecisionSchema> & { readonly id: string },
): Promise<void> {
  await database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const decision = await findDecision(database, scheme.id, id, transaction);
    if (decision.preparedBy === by.id) {
      throw new AppError('not-allowed', 'You prepared this, so someone else checks it.');
    }
    if (decision.state !== 'waiting for check') {
      throw new AppError('conflict', `This decision was ${decision.state} meanwhile.`);
    }
    if (decision.isChanged && verdict === 'checked') {
      const message = 'What this rests on has changed since it was prepared. Return it.';
      throw new AppError('conflict', message);
    }
    await closeDecisions(database, [id], { state: verdict, by: by.id, comment }, transaction);
    const { optionId } = decision;
    const action = VERDICT_ACTIONS[verdict];
    const settled = { by, scheme, optionId, decisions: [decision], action, after: { comment } };
    await settleDecisions(database, settled, transaction);
  });
}
