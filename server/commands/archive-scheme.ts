import type { z } from 'zod';
import type { archiveSchemeSchema } from '../../shared/schemas/schemes.ts';
import { AppError } from '../errors.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { recordChange } from './record-change.ts';
import { withOwnName } from './with-own-name.ts';

/** Archives a scheme, which is then only read, or brings it back. */
export async function archiveScheme(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  { archived, version }: z.infer<typeof archiveSchemeSchema>,
): Promise<Scheme> {
  return database.transaction(async (transaction) => {
    await scheme.reload({ transaction, lock: transaction.LOCK.UPDATE });
    if (scheme.version !== version) throw new AppError('conflict');
    const before = { archivedAt: scheme.archivedAt };
    if (archived === (before.archivedAt !== null)) return scheme;
    const after = { archivedAt: archived ? new Date() : null };
    await withOwnName(() => scheme.update({ ...after, version: version + 1 }, { transaction }));
    const action = archived ? 'archive scheme' : 'bring back scheme';
    const subject = { kind: 'scheme', id: scheme.id };
    await recordChange(
      { by: actor, schemeId: scheme.id, action, subject, before, after },
      transaction,
    );
    return scheme;
  });
}
