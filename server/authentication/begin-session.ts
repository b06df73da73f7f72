import type { Request } from 'express';
import { userOf } from './user-of.ts';

/**
 * Signs somebody in. passport makes a new session, so neither an id planted beforehand nor the CSRF token
 * of the old one is of use.
 */
export function beginSession(req: Request, user: Express.User): Promise<void> {
  return new Promise((resolve, reject) => {
    req.logIn(userOf(user), (error: unknown) => {
      if (error instanceof Error) {
        reject(error);
        return;
      }
      req.session.signedInAt = Date.now();
      resolve();
    });
  });
}
