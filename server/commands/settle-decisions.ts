import type { Sequelize, Transaction } from 'sequelize';
import { refreshStandings } from '../models/decisions.ts';
import { moveDecisionsOn } from '../models/move-decisions-on.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { recordChange } from './record-change.ts';

type Settled = {
  readonly by: Actor;
  readonly scheme: Scheme;
  readonly optionId: string;
  readonly decisions: readonly { readonly id: string; readonly buildingId: number }[];
  readonly action: string;
  readonly after?: object;
};

/** After decisions were moved on: where their buildings stand now, and one line in the audit trail. */
export async function settleDecisions(
  database: Sequelize,
  { by, scheme, optionId, decisions, action, after = {} }: Settled,
  transaction: Transaction,
): Promise<void> {
  const buildings = decisions.map(({ buildingId }) => buildingId);
  await refreshStandings(database, optionId, buildings, transaction);
  await moveDecisionsOn(scheme, transaction);
  const [one, ...others] = decisions;
  const id = one !== undefined && others.length === 0 ? one.id : optionId;
  const told = { decisions: decisions.length, ...after };
  await recordChange(
    { by, schemeId: scheme.id, action, subject: { kind: 'decisions', id }, after: told },
    transaction,
  );
}

/** What the trail calls a verdict. */
export const VERDICT_ACTIONS = {
  checked: 'check decisions',
  returned: 'return decisions',
} as const;
