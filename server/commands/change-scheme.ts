import type { z } from 'zod';
import type { changeSchemeSchema } from '../../shared/schemas/schemes.ts';
import { AppError } from '../errors.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';
import { withOwnName } from './with-own-name.ts';

/** Changes a scheme, unless somebody else has changed it since it was read. */
export async function changeScheme(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  { version, name, description }: z.infer<typeof changeSchemeSchema>,
): Promise<Scheme> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    if (scheme.version !== version) throw new AppError('conflict');
    const before = { name: scheme.name, description: scheme.description };
    const after = { name: name ?? scheme.name, description: description ?? scheme.description };
    await withOwnName(() => scheme.update({ ...after, version: version + 1 }, { transaction }));
    const subject = { kind: 'scheme', id: scheme.id };
    await recordChange(
      { by: actor, schemeId: scheme.id, action: 'change scheme', subject, before, after },
      transaction,
    );
    return scheme;
  });
}
