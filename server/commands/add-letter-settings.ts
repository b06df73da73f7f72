import type { z } from 'zod';
import type { newLetterSettingsSchema } from '../../shared/schemas/letter-settings.ts';
import { AppError } from '../errors.ts';
import { heldSettings, insertSettings, type HeldSettings } from '../models/letter-settings.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Adds the next version of the settings of letters, unless somebody else has added one since it was begun. */
export async function addLetterSettings(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { basedOn, settings }: z.infer<typeof newLetterSettingsSchema>,
): Promise<HeldSettings> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const held = await heldSettings(database, scheme, transaction);
    if (held.version !== basedOn) throw new AppError('conflict');
    const row = { schemeId: scheme.id, version: basedOn + 1, by: by.id };
    await insertSettings(database, row, settings, transaction);
    const subject = { kind: 'letter settings', id: String(row.version) };
    const change = { by, schemeId: scheme.id, action: 'change letter settings', subject };
    const [before, after] = [{ settings: held.settings }, { settings }];
    await recordChange({ ...change, before, after }, transaction);
    return heldSettings(database, scheme, transaction);
  });
}
