import type { Sequelize, Transaction } from 'sequelize';
import { DECISION_KINDS, type WaitingDecisions } from '../../shared/schemas/decisions.ts';
import type { RegisterFilter } from '../../shared/schemas/register.ts';
import { findWaiting, type WaitingDecision } from '../models/decisions.ts';
import { findShownRun } from '../models/find-shown-run.ts';
import type { Actor } from '../policies/actor.ts';
import { meantIds } from '../register/meant-ids.ts';

/** What waits for a check, and for which option; null where no run is shown. */
type WaitingOnOption = {
  readonly optionId: string | null;
  readonly waiting: readonly WaitingDecision[];
};

/** The decisions that wait on the buildings that are meant, for the option that is shown. */
export async function waitingForCheck(
  database: Sequelize,
  schemeId: string,
  filter: RegisterFilter,
  transaction: Transaction | null,
): Promise<WaitingOnOption> {
  const shown = await findShownRun(database, schemeId, transaction);
  const { optionId } = shown;
  if (optionId === null) return { optionId, waiting: [] };
  const ids = await meantIds({ database, transaction }, { schemeId, ...shown }, filter);
  return { optionId, waiting: await findWaiting(database, optionId, ids, transaction) };
}

/** Whether somebody may check a decision: not their own, and not on a basis that has changed. */
export function mayCheck(
  { preparedBy, isChanged }: Pick<WaitingDecision, 'preparedBy' | 'isChanged'>,
  { id }: Pick<Actor, 'id'>,
): boolean {
  return preparedBy !== id && !isChanged;
}

/** What waits, counted for whoever would check it. */
export function countWaiting(waiting: readonly WaitingDecision[], by: Actor): WaitingDecisions {
  const open = waiting.filter((decision) => mayCheck(decision, by));
  const kinds = DECISION_KINDS.map((kind) => ({
    kind,
    count: open.filter((decision) => decision.kind === kind).length,
  }));
  return {
    kinds: kinds.filter(({ count }) => count > 0),
    may: open.length,
    own: waiting.filter(({ preparedBy }) => preparedBy === by.id).length,
    changed: waiting.filter(({ isChanged, preparedBy }) => isChanged && preparedBy !== by.id)
      .length,
  };
}
