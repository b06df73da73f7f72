import type { Request, Response } from 'express';
import multer from 'multer';
import { AppError } from '../errors.ts';

const MEGABYTE = 1024 * 1024;

function asAppError(error: unknown, megabytes: number): AppError {
  if (!(error instanceof multer.MulterError)) {
    return new AppError('unreadable', 'The upload broke off or is damaged. Send it again.');
  }
  if (error.code === 'LIMIT_FILE_SIZE') {
    return new AppError('too-large', `The file is larger than ${megabytes} MB.`);
  }
  const fields = [{ path: 'file', message: 'Send one file, as "file".' }];
  return new AppError('invalid-input', undefined, fields);
}

/**
 * The one file of an upload, in memory. Called by handlers once they know who asks and may, so that
 * nobody else's upload is taken in.
 */
export function receiveFile(req: Request, res: Response, mostBytes: number): Promise<Buffer> {
  const limits = { fileSize: mostBytes, files: 1, fields: 0, parts: 1, headerPairs: 20 };
  const receive = multer({ storage: multer.memoryStorage(), limits }).single('file');
  return new Promise((resolve, reject) => {
    receive(req, res, (error: unknown) => {
      if (error !== undefined && error !== null) reject(asAppError(error, mostBytes / MEGABYTE));
      else if (req.file !== undefined) resolve(req.file.buffer);
      else {
        const fields = [{ path: 'file', message: 'Choose a file.' }];
        reject(new AppError('invalid-input', undefined, fields));
      }
    });
  });
}
