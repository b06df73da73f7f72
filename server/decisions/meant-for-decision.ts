import type { Sequelize, Transaction } from 'sequelize';
import { needsReason, whyNotDecided } from '../../shared/assessment/decision-kinds.ts';
import type { DecisionKind } from '../../shared/schemas/decisions.ts';
import type { DecisionBasis } from '../../shared/schemas/decision-answers.ts';
import type { RegisterFilter } from '../../shared/schemas/register.ts';
import { findConsidered, type Considered } from '../models/find-considered.ts';
import { findWaiting } from '../models/decisions.ts';
import { newestRules } from '../models/newest-rules.ts';
import type { Run } from '../models/run.ts';
import { inBatches } from '../register/in-batches.ts';
import { meantIds } from '../register/meant-ids.ts';
import { concludeBy } from './conclude.ts';

/** What is asked of the buildings that a filter means. */
export type Proposed = {
  readonly filter: RegisterFilter;
  readonly kind: DecisionKind;
  readonly reason: string;
};

/** A building that is meant: with what a decision rests on, or why it cannot have it. */
export type Meant = { readonly building: Considered } & (
  { readonly basis: DecisionBasis; readonly why: null } | { readonly why: string }
);

function whyNot(
  { kind, reason }: Proposed,
  basis: DecisionBasis | null,
  isWaiting: boolean,
): string | null {
  if (basis === null) return 'It was not in the run.';
  if (isWaiting) return 'A decision on it waits for a check already.';
  const why = whyNotDecided(kind, basis);
  if (why !== null) return why;
  return needsReason(kind, basis) && reason === '' ? 'A reason has to be given.' : null;
}

/** The buildings that are meant, part by part, each with whether it can have the decision. */
export async function* meantForDecision(
  database: Sequelize,
  run: Run,
  proposed: Proposed,
  transaction: Transaction | null,
): AsyncGenerator<Meant[]> {
  const { schemeId, id: runId, alignmentId: optionId } = run;
  const { rules } = await newestRules(schemeId, transaction);
  const conclude = concludeBy(run, rules);
  const register = { schemeId, runId, optionId };
  const meant = await meantIds({ database, transaction }, register, proposed.filter);
  for await (const ids of inBatches(meant)) {
    const [considered, waiting] = await Promise.all([
      findConsidered(database, runId, ids, transaction),
      findWaiting(database, optionId, ids, transaction),
    ]);
    const withDecision = new Set(waiting.map(({ buildingId }) => buildingId));
    yield considered.map((building): Meant => {
      const basis = conclude(building);
      const why = whyNot(proposed, basis, withDecision.has(building.id));
      if (basis === null || why !== null) return { building, why: why ?? '' };
      return { building, basis, why: null };
    });
  }
}
