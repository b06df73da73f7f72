import type { z } from 'zod';
import type { RegisterChange, removeManySchema } from '../../shared/schemas/register-changes.ts';
import { filterInWords } from '../exports/filter-in-words.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { meantBuildings } from '../register/meant-buildings.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';
import { lockScheme } from './lock-scheme.ts';

/** Takes all buildings that a filter means out of the register, unless there are more or fewer than was said. */
export async function removeBuildings(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  meant: z.infer<typeof removeManySchema>,
): Promise<RegisterChange> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const removed = await meantBuildings(database, scheme.id, meant, transaction);
    const cause = { kind: 'remove', by, source: filterInWords(meant.filter) } as const;
    return changeRegister(database, scheme, cause, { removed }, transaction);
  });
}
