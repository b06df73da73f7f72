import type { z } from 'zod';
import type { changeMatterSchema } from '../../shared/schemas/matters.ts';
import { AppError } from '../errors.ts';
import { findAssessors } from '../models/find-assessors.ts';
import { updateMatter } from '../models/matter-changes.ts';
import type { FoundMatter } from '../models/matters.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readMatter, readSeenMatter, recordMatter, standingOf } from './kept-matter.ts';
import { lockScheme } from './lock-scheme.ts';

type Asked = z.infer<typeof changeMatterSchema> & { readonly id: string };

/** Changes where a matter stands, by when it is answered or by whom, unless it has changed since it was seen. */
export async function changeMatter(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  asked: Asked,
): Promise<FoundMatter> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const matter = await readSeenMatter(database, scheme.id, asked, transaction);
    const before = standingOf(matter);
    const { state = before.state, due = before.due, assignedTo = before.assignedTo } = asked;
    const after = { state, due, assignedTo };
    if (assignedTo !== null && assignedTo !== before.assignedTo) {
      const assessors = await findAssessors(database, scheme.id, transaction);
      if (!assessors.some(({ id }) => id === assignedTo)) {
        const message = 'Choose somebody who is assessor of this scheme.';
        throw new AppError('invalid-input', undefined, [{ path: 'assignedTo', message }]);
      }
    }
    await updateMatter(database, matter.id, { ...before, ...after }, transaction);
    const was = { state: before.state, due: before.due, assignedTo: before.assignedTo };
    const told = { id: matter.id, action: 'change matter', before: was, after };
    await recordMatter(by, scheme, told, transaction);
    return readMatter(database, scheme.id, { id: matter.id }, transaction);
  });
}
