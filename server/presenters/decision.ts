import { decisionSchema, type Decision } from '../../shared/schemas/decision-answers.ts';
import type { FoundDecision } from '../models/find-decisions.ts';
import type { SchemeActor } from '../policies/actor.ts';
import { schemeAbilities } from '../policies/scheme-policy.ts';

function whyNotCheck(decision: FoundDecision, actor: SchemeActor): string | null {
  if (decision.preparedBy.id === actor.id) return 'You prepared this, so someone else checks it.';
  if (decision.changes !== null) return 'What this rests on has changed since. Return it.';
  return null;
}

/** What leaves the server of a decision, for one actor. */
export function presentDecision(
  decision: FoundDecision,
  actor: SchemeActor,
  isArchived: boolean,
): Decision {
  const can = schemeAbilities(actor, isArchived);
  const isWaiting = decision.state === 'waiting for check';
  const why = whyNotCheck(decision, actor);
  const isOwn = decision.preparedBy.id === actor.id;
  return decisionSchema.parse({
    id: decision.id,
    buildingId: decision.buildingId,
    run: { id: decision.runId, number: decision.runNumber, option: decision.option },
    rulesVersion: decision.rulesVersion,
    buildingVersion: decision.buildingVersion,
    kind: decision.kind,
    category: decision.category,
    reason: decision.reason,
    basis: decision.basis,
    batch: { id: decision.batchId, size: decision.batchSize },
    preparedBy: decision.preparedBy,
    preparedAt: decision.preparedAt.toISOString(),
    state: decision.state,
    checkedBy: decision.checkedBy,
    checkedAt: decision.checkedAt?.toISOString() ?? null,
    comment: decision.comment,
    changes: decision.changes ?? [],
    changedBy:
      decision.changedRun === null || decision.changedAt === null
        ? null
        : {
            run: decision.changedRun,
            rulesVersion: decision.changedRules,
            at: decision.changedAt.toISOString(),
          },
    abilities: {
      check: isWaiting && can.checkDecisions && !isOwn,
      withdraw: isWaiting && can.prepareDecisions && isOwn,
    },
    mayNotCheck: isWaiting && can.checkDecisions ? why : null,
  });
}
