import type { Request, Response } from 'express';
import type { SessionAnswer } from '../../shared/schemas/session.ts';
import { csrfTokenOf } from '../middleware/csrf.ts';
import type { Services } from '../services.ts';

/** Who a request's session belongs to, and the token that the next change must carry. */
export function presentSession({ env }: Services, req: Request, res: Response): SessionAnswer {
  const { user } = req;
  return {
    csrfToken: csrfTokenOf(req, res, env),
    person: user
      ? { id: user.id, name: user.name, email: user.email, isAdministrator: user.isAdministrator }
      : null,
    demo: env.DEMO,
  };
}
