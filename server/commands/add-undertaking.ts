import { randomUUID } from 'node:crypto';
import type { UndertakingValues } from '../../shared/schemas/undertakings.ts';
import type { Scheme } from '../models/scheme.ts';
import { insertUndertaking, type FoundUndertaking } from '../models/undertakings.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readUndertaking, requireOfScheme, toldOfUndertaking } from './kept-undertaking.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Adds to the register of what was promised to whom. */
export async function addUndertaking(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  values: UndertakingValues,
): Promise<FoundUndertaking> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    await requireOfScheme(database, scheme.id, values, null, transaction);
    const id = randomUUID();
    const place = { id, schemeId: scheme.id, by: by.id };
    await insertUndertaking(database, place, values, transaction);
    const change = {
      ...{ by, schemeId: scheme.id, action: 'add undertaking' },
      ...{ subject: { kind: 'undertaking', id }, after: toldOfUndertaking(values) },
    };
    await recordChange(change, transaction);
    return readUndertaking(database, scheme.id, id, transaction);
  });
}
