import type { Sequelize, Transaction } from 'sequelize';
import { basisChanges } from '../../shared/assessment/conclusion.ts';
import {
  findLiveDecisions,
  refreshStandings,
  replaceMarks,
  type DecisionMark,
  type LiveDecision,
} from '../models/decisions.ts';
import { findConsidered } from '../models/find-considered.ts';
import { findOptionsDecided } from '../models/find-options-decided.ts';
import { moveDecisionsOn } from '../models/move-decisions-on.ts';
import { newestRules } from '../models/newest-rules.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import { concludeBy, type Conclude } from './conclude.ts';

type Looking = {
  readonly database: Sequelize;
  readonly run: Run;
  readonly rulesVersion: number;
  readonly conclude: Conclude;
  readonly transaction: Transaction;
};

async function markSome(looking: Looking, decisions: readonly LiveDecision[]): Promise<void> {
  const { database, run, rulesVersion, conclude, transaction } = looking;
  const ids = [...new Set(decisions.map(({ buildingId }) => buildingId))];
  const considered = await findConsidered(database, run.id, ids, transaction);
  const now = new Map(considered.map((building) => [building.id, conclude(building)]));
  const found = decisions.flatMap(({ id, buildingId, basis }): DecisionMark[] => {
    const changes = basisChanges(basis, now.get(buildingId) ?? null);
    return changes.length === 0 ? [] : [{ id, changes }];
  });
  const looked = decisions.map(({ id }) => id);
  await replaceMarks(database, looked, found, { runId: run.id, rulesVersion }, transaction);
  await refreshStandings(database, run.alignmentId, ids, transaction);
}

/**
 * Looks whether what decisions rest on is still so: by the newest complete run of their option, the register
 * and the rules as they are now. Marks exactly those where it is not and says what has changed; one that
 * stands again loses its mark. Of some buildings, or of all.
 */
export async function refreshMarks(
  database: Sequelize,
  scheme: Scheme,
  ids: readonly number[] | null,
  transaction: Transaction,
): Promise<void> {
  const options = await findOptionsDecided(database, scheme.id, transaction);
  if (options.length === 0) return;
  const { version: rulesVersion, rules } = await newestRules(scheme.id, transaction);
  for (const { optionId, runId } of options) {
    const run = await Run.findByPk(runId, { transaction, rejectOnEmpty: true });
    const looking = {
      ...{ database, run, rulesVersion, transaction },
      conclude: concludeBy(run, rules),
    };
    for await (const some of findLiveDecisions(database, optionId, ids, transaction)) {
      await markSome(looking, some);
    }
  }
  await moveDecisionsOn(scheme, transaction);
}
