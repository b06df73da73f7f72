import type { Request, Response } from 'express';
import type { PhotographType } from '../../shared/schemas/visits.ts';
import { AppError } from '../errors.ts';
import type { Services } from '../services.ts';
import { placeOfPhotograph } from './photograph-folder.ts';

const ENDINGS = { 'image/jpeg': 'jpg', 'image/png': 'png', 'image/webp': 'webp' } as const;

type SentPhotograph = {
  /** Its place among those that came with it, from 0. */
  readonly number: number;
  readonly file: { readonly type: PhotographType; readonly sha256: string } | null;
};

type PhotographCall = {
  readonly services: Services;
  readonly req: Request;
  readonly res: Response;
};

function sendFile(res: Response, root: string, sha256: string): Promise<void> {
  const own = { root, dotfiles: 'allow', cacheControl: false, lastModified: false, etag: false } as const; // prettier-ignore
  return new Promise((resolve, reject) => {
    res.sendFile(placeOfPhotograph(sha256), own, (error?: Error) => {
      // whoever has seen enough goes; what was sent cannot be taken back
      if (error === undefined || res.headersSent) resolve();
      else reject(new AppError('not-found', 'The file of this photograph is not on this server.'));
    });
  });
}

/**
 * Sends a photograph as what our record says that it is. A browser may keep it for the person and asks each
 * time whether they may still see it.
 */
export async function sendPhotograph(
  { services, req, res }: PhotographCall,
  { number, file }: SentPhotograph,
): Promise<void> {
  if (file === null) throw new AppError('not-found', 'This photograph has not arrived yet.');
  res.set({
    'Content-Type': file.type,
    'X-Content-Type-Options': 'nosniff',
    'Content-Disposition': `inline; filename="photograph-${number + 1}.${ENDINGS[file.type]}"`,
    'Content-Security-Policy': "default-src 'none'; sandbox",
    'Cache-Control': 'private, no-cache',
    ETag: `"${file.sha256}"`,
  });
  if (req.fresh) res.status(304).end();
  else await sendFile(res, services.env.PHOTOGRAPHS_FOLDER, file.sha256);
}
