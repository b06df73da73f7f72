import type { Transaction } from 'sequelize';
import type { PhotographType } from '../../shared/schemas/visits.ts';
import { AppError } from '../errors.ts';
import type { Scheme } from '../models/scheme.ts';
import { cleanPhotograph } from '../photographs/clean-photograph.ts';
import { keepInFolder } from '../photographs/photograph-folder.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';

/** The file of a photograph that has arrived: its hash, type and length. */
type File = { readonly sha256: string; readonly type: PhotographType; readonly bytes: number };

type Announced<Kept> = {
  readonly sent: Buffer;
  /** Whether what tells where it was taken stays. */
  readonly keepsPlace: boolean;
  /** Writes the file down unless one is there; gives the one that is there then. */
  readonly write: (file: File, transaction: Transaction) => Promise<Kept>;
};

/**
 * Keeps the file of a photograph that was announced, told by its content and rewritten. The same file sent
 * again is kept once, another one is refused.
 */
export async function keepPhotographOnce<Kept extends Pick<File, 'sha256'>>(
  { env, database }: Pick<Services, 'env' | 'database'>,
  scheme: Scheme,
  { sent, keepsPlace, write }: Announced<Kept>,
): Promise<Kept> {
  const { type, bytes } = cleanPhotograph(sent, keepsPlace);
  const sha256 = await keepInFolder(env.PHOTOGRAPHS_FOLDER, bytes);
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const kept = await write({ sha256, type, bytes: bytes.byteLength }, transaction);
    if (kept.sha256 !== sha256) {
      throw new AppError('already-exists', 'Another photograph is kept under this number already.');
    }
    return kept;
  });
}
