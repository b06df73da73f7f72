import { AppError } from '../errors.ts';
import { RegisterView } from '../models/register-view.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { recordChange } from './record-change.ts';

/** Deletes a view that one person keeps; somebody else's answers like none. */
export async function deleteRegisterView(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  viewId: string,
): Promise<void> {
  await database.transaction(async (transaction) => {
    const where = { id: viewId, schemeId: scheme.id, personId: actor.id };
    const view = await RegisterView.findOne({ where, transaction });
    if (view === null) throw new AppError('not-found');
    await view.destroy({ transaction });
    const subject = { kind: 'register view', id: viewId };
    const change = { by: actor, schemeId: scheme.id, action: 'delete register view', subject };
    await recordChange({ ...change, before: { name: view.name } }, transaction);
  });
}
