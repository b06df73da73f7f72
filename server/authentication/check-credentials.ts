import type { Request, Response } from 'express';
import { AppError } from '../errors.ts';
import { passport } from './passport.ts';

/** The person whose e-mail and password a request carries, or one refusal whatever is wrong. */
export function checkCredentials(req: Request, res: Response): Promise<Express.User> {
  return new Promise((resolve, reject) => {
    function decided(error: Error | null, user?: Express.User | false): void {
      if (error !== null) reject(error);
      else if (user === undefined || user === false) reject(new AppError('wrong-credentials'));
      else resolve(user);
    }
    void passport.authenticate('local', decided)(req, res, reject);
  });
}
