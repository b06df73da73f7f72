import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockAlignment } from './lock-alignment.ts';
import { recordChange } from './record-change.ts';

/** Removes an option; the trail keeps its design. */
export async function removeAlignment(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  id: string,
): Promise<void> {
  await database.transaction(async (transaction) => {
    const alignment = await lockAlignment(scheme, id, transaction);
    const { name, design, shafts } = alignment;
    await alignment.destroy({ transaction });
    const subject = { kind: 'alignment', id };
    const change = { by: actor, schemeId: scheme.id, action: 'remove alignment', subject };
    await recordChange({ ...change, before: { name, design, shafts } }, transaction);
  });
}
