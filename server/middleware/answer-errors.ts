import type { ErrorRequestHandler } from 'express';
import { z } from 'zod';
import { AppError, type ErrorCode } from '../errors.ts';
import type { Services } from '../services.ts';
import { loggedUrl } from './log-requests.ts';

const libraryError = z.object({ type: z.string() });

/** What body parsers throw, by their type and never by their text. */
const BY_TYPE: Readonly<Record<string, ErrorCode>> = {
  'entity.too.large': 'too-large',
  'entity.parse.failed': 'unreadable',
  'charset.unsupported': 'unreadable',
  'encoding.unsupported': 'unreadable',
  'request.aborted': 'unreadable',
};

function asAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  // an address whose letters cannot be read is nobody's
  if (error instanceof URIError) return new AppError('not-found');
  const known = libraryError.safeParse(error);
  return new AppError(BY_TYPE[known.success ? known.data.type : ''] ?? 'internal');
}

/** The one handler of errors: people get a sentence, the log gets the cause. */
export function answerErrors({ logger }: Services): ErrorRequestHandler {
  return (error: unknown, req, res, next) => {
    const found = asAppError(error);
    if (found.code === 'internal')
      logger.error({ err: error, path: loggedUrl(req.path) }, 'request failed');
    if (res.headersSent) {
      next(error);
      return;
    }
    const { code, message, fields, status } = found;
    res.status(status).json({ error: { code, message, fields } });
  };
}
