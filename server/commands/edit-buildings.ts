import type { z } from 'zod';
import type { editManySchema, RegisterChange } from '../../shared/schemas/register-changes.ts';
import { filterInWords } from '../exports/filter-in-words.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { meantBuildings } from '../register/meant-buildings.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';
import { lockScheme } from './lock-scheme.ts';

/** Gives all buildings that a filter means the same values, unless there are more or fewer than was said. */
export async function editBuildings(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  { attributes, ...meant }: z.infer<typeof editManySchema>,
): Promise<RegisterChange> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const found = await meantBuildings(database, scheme.id, meant, transaction);
    const changed = found.map((seen) => ({ ...seen, attributes }));
    const cause = { kind: 'edit many', by, source: filterInWords(meant.filter) } as const;
    return changeRegister(database, scheme, cause, { changed }, transaction);
  });
}
