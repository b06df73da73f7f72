import { AppError } from '../errors.ts';
import type { Scheme } from '../models/scheme.ts';
import { VisitPhotographFile } from '../models/visit-photograph-file.ts';
import type { VisitPhotograph } from '../models/visit-photograph.ts';
import { cleanPhotograph } from '../photographs/clean-photograph.ts';
import { keepInFolder } from '../photographs/photograph-folder.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';

/**
 * Keeps the file of a photograph that a visit told of; the visit's line in the audit trail counts it. The
 * same file sent again is kept once, another one is refused.
 */
export async function keepPhotograph(
  { env, database }: Services,
  scheme: Scheme,
  photograph: VisitPhotograph,
  sent: Buffer,
): Promise<VisitPhotographFile> {
  const { type, bytes } = cleanPhotograph(sent, photograph.keepsPlace);
  const sha256 = await keepInFolder(env.PHOTOGRAPHS_FOLDER, bytes);
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const kept = await VisitPhotographFile.findByPk(photograph.id, { transaction });
    if (kept === null) {
      const file = { photographId: photograph.id, sha256, type, bytes: bytes.byteLength };
      return VisitPhotographFile.create(file, { transaction });
    }
    if (kept.sha256 !== sha256) {
      throw new AppError('already-exists', 'Another photograph is kept under this number already.');
    }
    return kept;
  });
}
