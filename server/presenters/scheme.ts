import type { SchemeAnswer } from '../../shared/schemas/schemes.ts';
import type { Scheme } from '../models/scheme.ts';
import type { SchemeActor } from '../policies/actor.ts';
import { schemeAbilities } from '../policies/scheme-policy.ts';

/** What leaves the server of a scheme, for one actor. */
export function presentScheme(scheme: Scheme, actor: SchemeActor): SchemeAnswer {
  return {
    id: scheme.id,
    name: scheme.name,
    description: scheme.description,
    crs: scheme.crs,
    archivedAt: scheme.archivedAt?.toISOString() ?? null,
    version: scheme.version,
    registerVersion: scheme.registerVersion,
    backgroundVersion: scheme.backgroundVersion,
    roles: [...actor.roles].sort(),
    abilities: schemeAbilities(actor, scheme.archivedAt !== null),
  };
}
