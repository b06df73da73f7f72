import { deleteLayout } from '../models/plan-layouts.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { keptLayout } from './kept-layout.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Removes a layout; the trail keeps it, and prints keep what they were asked with. */
export async function removeLayout(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  id: string,
): Promise<void> {
  await database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const { name, layout } = await keptLayout(database, scheme.id, id, transaction);
    await deleteLayout(database, id, transaction);
    const subject = { kind: 'layout', id };
    const change = { by, schemeId: scheme.id, action: 'remove layout', subject };
    await recordChange({ ...change, before: { name, layout } }, transaction);
  });
}
