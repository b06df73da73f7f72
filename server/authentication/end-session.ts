import type { Request } from 'express';

/** Signs the person of a request out; passport makes a new, empty session. */
export function endSession(req: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    req.logOut((error: unknown) => {
      if (error instanceof Error) reject(error);
      else resolve();
    });
  });
}
