import { literal } from 'sequelize';
import type { Role } from '../../shared/schemas/roles.ts';
import { Membership } from './membership.ts';
import { Scheme } from './scheme.ts';
import type { Actor, SchemeActor } from '../policies/actor.ts';

export type OwnScheme = { readonly scheme: Scheme; readonly actor: SchemeActor };

/** The schemes that a person has a part in, with their roles there, by name. The administrator's are all. */
export async function findSchemes(actor: Actor): Promise<OwnScheme[]> {
  const memberships = await Membership.findAll({ where: { personId: actor.id } });
  const own = memberships.map(({ schemeId }) => schemeId);
  const schemes = await Scheme.findAll({
    where: actor.isAdministrator ? {} : { id: own },
    order: [literal('name collate "und-x-icu"'), 'id'],
  });
  return schemes.map((scheme) => {
    const here = memberships.filter(({ schemeId }) => schemeId === scheme.id);
    const roles: ReadonlySet<Role> = new Set(here.map(({ role }) => role));
    return { scheme, actor: { ...actor, roles } };
  });
}
