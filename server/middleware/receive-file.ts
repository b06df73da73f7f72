import { mkdir } from 'node:fs/promises';
import type { Request, Response } from 'express';
import multer from 'multer';
import { AppError } from '../errors.ts';

const MEGABYTE = 1024 * 1024;
const LONGEST_NAME = 200;

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

type ReceivedFile = NonNullable<Request['file']>;

async function receive(
  req: Request,
  res: Response,
  mostBytes: number,
  storage: multer.StorageEngine,
): Promise<ReceivedFile> {
  if (req.is('multipart/form-data') === false) {
    throw new AppError('wrong-content-type', 'Send the file as multipart/form-data, as "file".');
  }
  const limits = { fileSize: mostBytes, files: 1, fields: 0, parts: 1, headerPairs: 20 };
  const take = multer({ storage, limits, defParamCharset: 'utf8' }).single('file');
  return new Promise((resolve, reject) => {
    take(req, res, (error: unknown) => {
      if (error !== undefined && error !== null) reject(asAppError(error, mostBytes / MEGABYTE));
      else if (req.file !== undefined) resolve(req.file);
      else {
        const fields = [{ path: 'file', message: 'Choose a file.' }];
        reject(new AppError('invalid-input', undefined, fields));
      }
    });
  });
}

/**
 * The one file of an upload, in memory. Called by handlers once they know who asks and may, so that
 * nobody else's upload is taken in.
 */
export async function receiveFile(req: Request, res: Response, mostBytes: number): Promise<Buffer> {
  return (await receive(req, res, mostBytes, multer.memoryStorage())).buffer;
}

/** The same, straight into a folder: what is too large for memory. The receiver removes it. */
export async function receiveFileInto(
  folder: string,
  req: Request,
  res: Response,
  mostBytes: number,
): Promise<{ readonly file: string; readonly fileName: string }> {
  await mkdir(folder, { recursive: true });
  const storage = multer.diskStorage({ destination: folder });
  const { path, originalname } = await receive(req, res, mostBytes, storage);
  const fileName = originalname
    .replaceAll(/\p{Cc}+/gu, ' ')
    .trim()
    .slice(-LONGEST_NAME);
  return { file: path, fileName: fileName === '' ? 'file' : fileName };
}
