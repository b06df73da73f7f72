import type { Request } from 'express';
import { AppError } from '../errors.ts';
import type { Actor } from '../policies/actor.ts';

/** The signed-in person of a request, or a refusal. */
export function requireActor(req: Request): Actor {
  const { user } = req;
  if (user === undefined) throw new AppError('not-signed-in');
  return { id: user.id, isAdministrator: user.isAdministrator };
}
