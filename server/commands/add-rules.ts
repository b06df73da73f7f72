import type { z } from 'zod';
import type { newRulesSchema } from '../../shared/schemas/rules.ts';
import { refreshMarks } from '../decisions/refresh-marks.ts';
import { AppError } from '../errors.ts';
import { SchemeRules } from '../models/scheme-rules.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Adds the next version of a scheme's rules, unless somebody else has added one since it was begun. */
export async function addRules(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  { basedOn, rules }: z.infer<typeof newRulesSchema>,
): Promise<SchemeRules> {
  const schemeId = scheme.id;
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const newest = await SchemeRules.findOne({
      where: { schemeId },
      order: [['version', 'desc']],
      transaction,
    });
    if (newest?.version !== basedOn) throw new AppError('conflict');
    const version = basedOn + 1;
    const added = await SchemeRules.create(
      { schemeId, version, rules, createdBy: actor.id },
      { transaction },
    );
    await refreshMarks(database, scheme, null, transaction);
    const subject = { kind: 'rules', id: String(version) };
    const [before, after] = [{ rules: newest.rules }, { rules }];
    await recordChange(
      { by: actor, schemeId, action: 'change rules', subject, before, after },
      transaction,
    );
    return added;
  });
}
