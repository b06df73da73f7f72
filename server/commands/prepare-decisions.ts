import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { decisionsDoneSchema, newDecisionsSchema } from '../../shared/schemas/decisions.ts';
import { meantForDecision, type Meant } from '../decisions/meant-for-decision.ts';
import { shownRunOf } from '../decisions/shown-run-of.ts';
import { AppError } from '../errors.ts';
import { filterInWords } from '../exports/filter-in-words.ts';
import {
  insertDecisions,
  refreshStandings,
  type DecisionBatch,
  type PreparedDecision,
} from '../models/decisions.ts';
import { moveDecisionsOn } from '../models/move-decisions-on.ts';
import { newestRules } from '../models/newest-rules.ts';
import type { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

type Asked = z.infer<typeof newDecisionsSchema>;

async function batchOf(
  { id: runId, schemeId, alignmentId: optionId }: Run,
  { kind, category, reason }: Asked,
  by: Actor,
  transaction: Transaction,
): Promise<DecisionBatch> {
  const { version: rulesVersion } = await newestRules(schemeId, transaction);
  const batchId = randomUUID();
  const fixed = { schemeId, optionId, runId, rulesVersion, preparedBy: by.id };
  return { ...fixed, kind, category: category ?? null, reason, batchId };
}

/** Those that can have it. One building says why it cannot, and that it is still as it was seen. */
function prepared(some: readonly Meant[], { version, expected }: Asked): PreparedDecision[] {
  return some.flatMap((one) => {
    const { id, version: found } = one.building;
    if (version !== undefined && version !== found) throw new AppError('conflict');
    if (one.why === null) return [{ id, version: found, basis: one.basis }];
    if (expected === 1 && some.length === 1) throw new AppError('invalid-input', one.why);
    return [];
  });
}

/**
 * Prepares a decision for each of the buildings that are meant and can have it, for somebody else to check:
 * as many as the preview said, or none.
 */
export async function prepareDecisions(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  asked: Asked,
): Promise<z.infer<typeof decisionsDoneSchema>> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const run = await shownRunOf(database, scheme.id, asked.runId, transaction);
    const batch = await batchOf(run, asked, by, transaction);
    let count = 0;
    for await (const some of meantForDecision(database, run, asked, transaction)) {
      const decisions = prepared(some, asked);
      await insertDecisions(database, batch, decisions, transaction);
      const ids = decisions.map(({ id }) => id);
      await refreshStandings(database, batch.optionId, ids, transaction);
      count += decisions.length;
    }
    if (count !== asked.expected) {
      const message = `${count} buildings can have this now, not ${asked.expected}. Look at them again.`;
      throw new AppError('conflict', message);
    }
    await moveDecisionsOn(scheme, transaction);
    const { kind, category, reason, batchId } = batch;
    const after = { kind, category, reason, run: run.number, buildings: count };
    const subject = { kind: 'decisions', id: batchId };
    const meant = { meant: filterInWords(asked.filter) };
    await recordChange(
      {
        by,
        schemeId: scheme.id,
        action: 'prepare decisions',
        subject,
        after: { ...after, ...meant },
      },
      transaction,
    );
    return { batchId, count };
  });
}
