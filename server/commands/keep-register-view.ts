import type { z } from 'zod';
import type { newRegisterViewSchema } from '../../shared/schemas/register-views.ts';
import { AppError } from '../errors.ts';
import { RegisterView } from '../models/register-view.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { recordChange } from './record-change.ts';

const MOST = 100;

/** Keeps a view of a register for one person; a name that is used again replaces the older view. */
export async function keepRegisterView(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  given: z.infer<typeof newRegisterViewSchema>,
): Promise<RegisterView> {
  const { name, ...view } = given;
  const owner = { schemeId: scheme.id, personId: actor.id };
  return database.transaction(async (transaction) => {
    // of two who keep a view of one name at once the second waits and replaces it
    await scheme.reload({ transaction, lock: transaction.LOCK.UPDATE });
    const kept = await RegisterView.findOne({ where: { ...owner, name }, transaction });
    const count = await RegisterView.count({ where: owner, transaction });
    if (kept === null && count >= MOST) {
      const message = `You keep ${MOST} views here. Delete one before you keep another.`;
      throw new AppError('invalid-input', message, [{ path: 'name', message }]);
    }
    const done =
      (await kept?.update(view, { transaction })) ??
      (await RegisterView.create({ ...owner, name, ...view }, { transaction }));
    const subject = { kind: 'register view', id: done.id };
    const change = { by: actor, schemeId: scheme.id, action: 'keep register view', subject };
    await recordChange({ ...change, after: given }, transaction);
    return done;
  });
}
