import { AppError } from '../errors.ts';
import {
  keepPhotographFile,
  type MatterPhotograph,
  type PhotographFile,
} from '../models/matter-photographs.ts';
import type { Scheme } from '../models/scheme.ts';
import { cleanPhotograph } from '../photographs/clean-photograph.ts';
import { keepInFolder } from '../photographs/photograph-folder.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';

/**
 * Keeps the file of a photograph that an owner's message announced, without the place where it was taken; the
 * message's line in the audit trail counts it. The same file sent again is kept once, another one is refused.
 */
export async function keepMatterPhotograph(
  { env, database }: Services,
  scheme: Scheme,
  { id }: MatterPhotograph,
  sent: Buffer,
): Promise<PhotographFile> {
  const { type, bytes } = cleanPhotograph(sent, false);
  const sha256 = await keepInFolder(env.PHOTOGRAPHS_FOLDER, bytes);
  const file = { sha256, type, bytes: bytes.byteLength };
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const kept = await keepPhotographFile(database, id, file, transaction);
    if (kept.sha256 !== sha256) {
      throw new AppError('already-exists', 'Another photograph is kept under this number already.');
    }
    return kept;
  });
}
