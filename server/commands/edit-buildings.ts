import type { z } from 'zod';
import type { editManySchema, RegisterChange } from '../../shared/schemas/register-changes.ts';
import { AppError } from '../errors.ts';
import { filterInWords } from '../exports/filter-in-words.ts';
import { findVersions } from '../models/find-register-rows.ts';
import { registerCondition } from '../models/register-condition.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';
import { lockScheme } from './lock-scheme.ts';

/** Gives all buildings that a filter means the same values, unless there are more or fewer than was said. */
export async function editBuildings(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  { filter, expected, attributes }: z.infer<typeof editManySchema>,
): Promise<RegisterChange> {
  const condition = registerCondition(scheme.id, filter);
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const found = await findVersions(database, condition, transaction);
    if (found.length !== expected) {
      const message = `These are ${found.length} buildings now, not ${expected}. Look at them again.`;
      throw new AppError('conflict', message);
    }
    const changed = found.map((seen) => ({ ...seen, attributes }));
    const cause = { kind: 'edit many', by, source: filterInWords(filter) } as const;
    return changeRegister(database, scheme, cause, { changed }, transaction);
  });
}
