import type { z } from 'zod';
import type { changeLayoutSchema } from '../../shared/schemas/evidence.ts';
import { AppError } from '../errors.ts';
import { updateLayout, type FoundLayout } from '../models/plan-layouts.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { keptLayout } from './kept-layout.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';
import { withOwnName } from './with-own-name.ts';

/** Changes a layout, unless somebody else has changed it since it was read. */
export async function changeLayout(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  asked: z.infer<typeof changeLayoutSchema> & { readonly id: string },
): Promise<FoundLayout> {
  const { id, version, name, layout } = asked;
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const kept = await keptLayout(database, scheme.id, id, transaction);
    if (kept.version !== version) throw new AppError('conflict');
    const changed = { name, layout, by: by.id };
    await withOwnName(() => updateLayout(database, id, changed, transaction), 'a layout');
    const subject = { kind: 'layout', id };
    const change = { by, schemeId: scheme.id, action: 'change layout', subject };
    const before = { name: kept.name, layout: kept.layout };
    await recordChange({ ...change, before, after: { name, layout } }, transaction);
    return keptLayout(database, scheme.id, id, transaction);
  });
}
