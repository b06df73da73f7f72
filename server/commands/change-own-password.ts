import type { z } from 'zod';
import type { changePasswordSchema } from '../../shared/schemas/session.ts';
import { hashNewPassword } from '../authentication/hash-new-password.ts';
import { isRightPassword } from '../authentication/password-hash.ts';
import { AppError } from '../errors.ts';
import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { setPassword } from './set-password.ts';

/** Changes one's own password; every session of before ends, so the caller begins a new one. */
export async function changeOwnPassword(
  { database }: Services,
  actor: Actor,
  { currentPassword, newPassword }: z.infer<typeof changePasswordSchema>,
): Promise<Person> {
  const person = await Person.findByPk(actor.id, { rejectOnEmpty: true });
  const known = person.passwordHash;
  if (!(await isRightPassword(known, currentPassword))) {
    const fault = { path: 'currentPassword', message: 'This is not your password.' };
    throw new AppError('invalid-input', undefined, [fault]);
  }
  if (newPassword === currentPassword) {
    const fault = { path: 'newPassword', message: 'Choose another one than you have.' };
    throw new AppError('invalid-input', undefined, [fault]);
  }
  const passwordHash = await hashNewPassword(person, 'newPassword', newPassword);
  return database.transaction(async (transaction) => {
    await person.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE });
    if (person.passwordHash !== known) throw new AppError('conflict');
    await setPassword(person, passwordHash, 'change password', transaction);
    return person;
  });
}
