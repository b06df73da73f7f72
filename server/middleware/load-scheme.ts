import { z } from 'zod';
import { AppError } from '../errors.ts';
import { Membership } from '../models/membership.ts';
import { Scheme } from '../models/scheme.ts';
import type { Actor, SchemeActor } from '../policies/actor.ts';
import type { Services } from '../services.ts';

const idSchema = z.uuid();

/**
 * The scheme of a request with the actor's roles in it. A scheme that the actor has no part in answers
 * like one that does not exist.
 */
export async function loadScheme(
  _services: Services,
  actor: Actor,
  schemeId: unknown,
): Promise<{ scheme: Scheme; actor: SchemeActor }> {
  const id = idSchema.safeParse(schemeId);
  if (!id.success) throw new AppError('not-found');
  const [scheme, memberships] = await Promise.all([
    Scheme.findByPk(id.data),
    Membership.findAll({ where: { schemeId: id.data, personId: actor.id } }),
  ]);
  const roles = new Set(memberships.map(({ role }) => role));
  if (scheme === null || (roles.size === 0 && !actor.isAdministrator)) {
    throw new AppError('not-found');
  }
  return { scheme, actor: { ...actor, roles } };
}
