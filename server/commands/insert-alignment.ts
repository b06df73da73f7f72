import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { newAlignmentSchema } from '../../shared/schemas/alignments.ts';
import { AppError } from '../errors.ts';
import { Alignment } from '../models/alignment.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { recordChange } from './record-change.ts';
import { withOwnName } from './with-own-name.ts';

const MOST = 60;

/** Adds an option to a scheme that is locked; `by` is nobody where the demo is filled in. */
export async function insertAlignment(
  scheme: Scheme,
  by: Pick<Actor, 'id'> | null,
  { name, design, shafts }: z.infer<typeof newAlignmentSchema>,
  action: 'create alignment' | 'copy alignment',
  transaction: Transaction,
): Promise<Alignment> {
  const schemeId = scheme.id;
  if ((await Alignment.count({ where: { schemeId }, transaction })) >= MOST) {
    const message = `A scheme has ${MOST} options at most. Remove one before you add another.`;
    throw new AppError('invalid-input', message, [{ path: 'name', message }]);
  }
  const row = { schemeId, name, design, shafts, changedBy: by?.id ?? null };
  const created = await withOwnName(() => Alignment.create(row, { transaction }), 'an option');
  const subject = { kind: 'alignment', id: created.id };
  await recordChange(
    { by, schemeId, action, subject, after: { name, design, shafts } },
    transaction,
  );
  return created;
}
