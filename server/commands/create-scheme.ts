import type { z } from 'zod';
import type { newSchemeSchema } from '../../shared/schemas/schemes.ts';
import { findCrsForScheme } from '../crs/find-crs.ts';
import { AppError } from '../errors.ts';
import { SchemeRules } from '../models/scheme-rules.ts';
import { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { defaultRules } from './default-rules.ts';
import { recordChange } from './record-change.ts';
import { withOwnName } from './with-own-name.ts';
import { dayOf } from '../days.ts';

/** Creates a scheme on a projected system in metres, with the default rules as their version 1. */
export async function createScheme(
  { database }: Services,
  actor: Actor,
  { name, description, crs }: z.infer<typeof newSchemeSchema>,
): Promise<Scheme> {
  const system = (await findCrsForScheme(crs)) ?? { fault: `There is no system EPSG:${crs}.` };
  if ('fault' in system) {
    throw new AppError('invalid-input', undefined, [{ path: 'crs', message: system.fault }]);
  }
  return database.transaction(async (transaction) => {
    const scheme = await withOwnName(() =>
      Scheme.create({ name, description, crs }, { transaction }),
    );
    const rules = defaultRules(dayOf(scheme.createdAt));
    await SchemeRules.create(
      { schemeId: scheme.id, version: 1, rules, createdBy: actor.id },
      { transaction },
    );
    const subject = { kind: 'scheme', id: scheme.id };
    const after = { name, description, crs };
    await recordChange(
      { by: actor, schemeId: scheme.id, action: 'create scheme', subject, after },
      transaction,
    );
    return scheme;
  });
}
