import { whyNotDecided } from '../../shared/assessment/decision-kinds.ts';
import { DECISION_KINDS } from '../../shared/schemas/decisions.ts';
import {
  buildingDecisionsSchema,
  type BuildingDecisions,
} from '../../shared/schemas/decision-answers.ts';
import { AppError } from '../errors.ts';
import { findAssignee, findDecisions } from '../models/find-decisions.ts';
import { findConsidered } from '../models/find-considered.ts';
import { newestRules } from '../models/newest-rules.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import type { SchemeActor } from '../policies/actor.ts';
import { presentDecision } from '../presenters/decision.ts';
import type { Services } from '../services.ts';
import { concludeBy } from './conclude.ts';

/** The decisions on a building of a run, and what can be decided of it now. */
export async function buildingDecisions(
  { database }: Pick<Services, 'database'>,
  actor: SchemeActor,
  scheme: Scheme,
  { runId, buildingId }: { readonly runId: string; readonly buildingId: number },
): Promise<BuildingDecisions> {
  const run = await Run.findOne({ where: { id: runId, schemeId: scheme.id } });
  if (run === null) throw new AppError('not-found');
  const [{ rules }, [building], found, assignedTo] = await Promise.all([
    newestRules(scheme.id, null),
    findConsidered(database, run.id, [buildingId], null),
    findDecisions(database, run.alignmentId, buildingId),
    findAssignee(database, buildingId),
  ]);
  const conclusion = building === undefined ? null : concludeBy(run, rules)(building);
  if (building === undefined || conclusion === null) throw new AppError('not-found');
  const isArchived = scheme.archivedAt !== null;
  return buildingDecisionsSchema.parse({
    decisions: found.map((decision) => presentDecision(decision, actor, isArchived)),
    open: DECISION_KINDS.map((kind) => ({ kind, why: whyNotDecided(kind, conclusion) })),
    conclusion,
    version: building.version,
    assignedTo,
  });
}
