import type { z } from 'zod';
import type { assignBuildingsSchema } from '../../shared/schemas/decisions.ts';
import { AppError } from '../errors.ts';
import { filterInWords } from '../exports/filter-in-words.ts';
import { assignTo } from '../models/assign-to.ts';
import { findAssessors } from '../models/find-assessors.ts';
import { moveDecisionsOn } from '../models/move-decisions-on.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { meantBuildings } from '../register/meant-buildings.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Gives the buildings that a filter means to an assessor, or to nobody. */
export async function assignBuildings(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { personId, ...meant }: z.infer<typeof assignBuildingsSchema>,
): Promise<{ batchId: null; count: number }> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const assessors = await findAssessors(database, scheme.id, transaction);
    const person = assessors.find(({ id }) => id === personId);
    if (personId !== null && person === undefined) {
      const message = 'Choose somebody who is assessor of this scheme.';
      throw new AppError('invalid-input', undefined, [{ path: 'personId', message }]);
    }
    const found = await meantBuildings(database, scheme.id, meant, transaction);
    const ids = found.map(({ id }) => id);
    await assignTo(database, ids, { personId, by: by.id }, transaction);
    await moveDecisionsOn(scheme, transaction);
    const subject = { kind: 'scheme', id: scheme.id };
    const after = {
      to: person?.name ?? null,
      buildings: ids.length,
      meant: filterInWords(meant.filter),
    };
    const action = 'assign buildings';
    await recordChange({ by, schemeId: scheme.id, action, subject, after }, transaction);
    return { batchId: null, count: ids.length };
  });
}
