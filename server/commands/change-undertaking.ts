import type { UndertakingValues } from '../../shared/schemas/undertakings.ts';
import { AppError } from '../errors.ts';
import type { Scheme } from '../models/scheme.ts';
import { updateUndertaking, type FoundUndertaking } from '../models/undertakings.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readUndertaking, requireOfScheme, toldOfUndertaking } from './kept-undertaking.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Changes an undertaking or says that it is done, unless somebody else has changed it since it was seen. */
export async function changeUndertaking(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  asked: { readonly id: string; readonly version: number; readonly values: UndertakingValues },
): Promise<FoundUndertaking> {
  const { id, version, values } = asked;
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const kept = await readUndertaking(database, scheme.id, id, transaction);
    if (kept.version !== version) throw new AppError('conflict');
    await requireOfScheme(database, scheme.id, values, kept, transaction);
    await updateUndertaking(database, id, values, transaction);
    const before = toldOfUndertaking({ ...kept, buildingId: kept.building?.id ?? null });
    const change = {
      ...{ by, schemeId: scheme.id, action: 'change undertaking', before },
      ...{ subject: { kind: 'undertaking', id }, after: toldOfUndertaking(values) },
    };
    await recordChange(change, transaction);
    return readUndertaking(database, scheme.id, id, transaction);
  });
}
