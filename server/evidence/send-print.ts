import path from 'node:path';
import type { Response } from 'express';
import type { Env } from '../env.ts';
import { AppError } from '../errors.ts';
import type { FoundPrint } from '../models/prints.ts';
import { fingerprintOf, printFile } from './print-file.ts';

function fileName({ number, name, runNumber }: FoundPrint): string {
  const words = name
    .normalize('NFD')
    .replaceAll(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/gi, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60);
  return [`print-${number}`, words, `run-${runNumber}.pdf`].filter((one) => one !== '').join('-');
}

const GONE = 'The file of this print is not on this server. Print it again.';
const CHANGED =
  'The file of this print is not what was printed, so it is not sent. Print it again.';

/** Refuses a file that is not there or no longer what was printed. */
async function refuseOther(file: string, { fingerprint }: FoundPrint): Promise<void> {
  const found = await fingerprintOf(file).catch(() => null);
  if (found === null) throw new AppError('not-found', GONE);
  if (found !== fingerprint) throw new AppError('conflict', CHANGED);
}

/** Sends the file of a print that is whole, as it was printed. */
export async function sendPrint(
  res: Response,
  env: Pick<Env, 'PRINTS_FOLDER'>,
  print: FoundPrint,
): Promise<void> {
  if (print.state !== 'done') {
    throw new AppError('conflict', 'This print is not done, so there is no file of it.');
  }
  const file = printFile(env, print.id);
  await refuseOther(file, print);
  const own = { root: path.dirname(file), dotfiles: 'allow', cacheControl: false, lastModified: false, etag: false } as const; // prettier-ignore
  res.attachment(fileName(print)).type('application/pdf');
  res.set({ 'X-Content-Type-Options': 'nosniff', 'Cache-Control': 'private, no-cache' });
  await new Promise<void>((resolve, reject) => {
    res.sendFile(path.basename(file), own, (error?: Error) => {
      // whoever has seen enough goes; what was sent cannot be taken back
      if (error === undefined || res.headersSent) resolve();
      else reject(new AppError('not-found', GONE));
    });
  });
}
