import type { RegisterChange as RegisterChangeAnswer } from '../../shared/schemas/register-changes.ts';
import { AppError } from '../errors.ts';
import { RegisterChange } from '../models/register-change.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { editsBackwards } from '../register/edits-backwards.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';
import { lockScheme } from './lock-scheme.ts';

/** Takes a change of the register back, unless something of it was changed since: all of it or nothing. */
export async function undoChange(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  changeId: string,
): Promise<RegisterChangeAnswer> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const where = { id: changeId, schemeId: scheme.id };
    const change = await RegisterChange.findOne({ where, transaction });
    if (change === null) throw new AppError('not-found');
    const undone = await RegisterChange.count({ where: { undoes: changeId }, transaction });
    if (undone > 0) throw new AppError('conflict', 'This change has been undone already.');
    const cause = { kind: 'undo', by: actor, undoes: changeId } as const;
    const edits = editsBackwards(database, changeId, transaction);
    return changeRegister(database, scheme, cause, edits, transaction);
  });
}
