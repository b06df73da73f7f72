import type { Transaction } from 'sequelize';
import type { Scheme } from './scheme.ts';

/** Tells what is kept of decisions by version that they have moved on. */
export async function moveDecisionsOn(scheme: Scheme, transaction: Transaction): Promise<void> {
  await scheme.increment('decisionsVersion', { transaction });
}
