import type { z } from 'zod';
import type {
  decisionsDoneSchema,
  withdrawDecisionsSchema,
} from '../../shared/schemas/decisions.ts';
import { waitingForCheck } from '../decisions/waiting-for-check.ts';
import { AppError } from '../errors.ts';
import { refreshStandings, withdrawWaiting } from '../models/decisions.ts';
import { findShownRun } from '../models/find-shown-run.ts';
import { moveDecisionsOn } from '../models/move-decisions-on.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Takes back what a person prepared and nobody has checked yet, on the buildings that are meant. */
export async function withdrawDecisions(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { filter, expected }: z.infer<typeof withdrawDecisionsSchema>,
): Promise<z.infer<typeof decisionsDoneSchema>> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const { optionId } = await findShownRun(database, scheme.id, transaction);
    const waiting = await waitingForCheck(database, scheme.id, filter, transaction);
    const own = waiting.filter(({ preparedBy }) => preparedBy === by.id);
    if (own.length !== expected || optionId === null) {
      const message = `${own.length} decisions of yours wait here now, not ${expected}. Look at them again.`;
      throw new AppError('conflict', message);
    }
    const ids = own.map(({ id }) => id);
    await withdrawWaiting(database, ids, transaction);
    const buildings = own.map(({ buildingId }) => buildingId);
    await refreshStandings(database, optionId, buildings, transaction);
    await moveDecisionsOn(scheme, transaction);
    const subject = { kind: 'decisions', id: ids.length === 1 ? (ids[0] ?? '') : optionId };
    const after = { decisions: ids.length };
    const action = 'withdraw decisions';
    await recordChange({ by, schemeId: scheme.id, action, subject, after }, transaction);
    return { batchId: null, count: ids.length };
  });
}
