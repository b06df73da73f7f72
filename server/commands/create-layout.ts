import { randomUUID } from 'node:crypto';
import type { z } from 'zod';
import type { newLayoutSchema } from '../../shared/schemas/evidence.ts';
import { AppError } from '../errors.ts';
import { findLayouts, insertLayout, type FoundLayout } from '../models/plan-layouts.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { keptLayout } from './kept-layout.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';
import { withOwnName } from './with-own-name.ts';

const MOST = 200;

/** Keeps a layout under a name that is its own. */
export async function createLayout(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { name, layout }: z.infer<typeof newLayoutSchema>,
): Promise<FoundLayout> {
  const place = { id: randomUUID(), schemeId: scheme.id };
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    if ((await findLayouts(database, scheme.id, null, transaction)).length >= MOST) {
      const message = `A scheme has ${MOST} layouts at most. Remove one before you add another.`;
      throw new AppError('invalid-input', message, [{ path: 'name', message }]);
    }
    const kept = { name, layout, by: by.id };
    await withOwnName(() => insertLayout(database, place, kept, transaction), 'a layout');
    const subject = { kind: 'layout', id: place.id };
    const change = { by, schemeId: scheme.id, action: 'create layout', subject };
    await recordChange({ ...change, after: { name, layout } }, transaction);
    return keptLayout(database, scheme.id, place.id, transaction);
  });
}
