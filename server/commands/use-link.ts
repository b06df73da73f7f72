import { Op } from 'sequelize';
import { hashNewPassword } from '../authentication/hash-new-password.ts';
import { AppError } from '../errors.ts';
import { findOpenLink } from '../models/find-open-link.ts';
import type { Person } from '../models/person.ts';
import { SingleUseLink } from '../models/single-use-link.ts';
import type { Services } from '../services.ts';
import { setPassword } from './set-password.ts';

const ACTIONS = {
  invitation: 'accept invitation',
  'password-reset': 'reset password',
} as const;

/** Sets the password that somebody with a link chose. Of two who use it at once, one wins. */
export async function useLink(
  { database }: Services,
  token: string,
  password: string,
): Promise<Person> {
  const { link, person } = await findOpenLink(token);
  const passwordHash = await hashNewPassword(person, 'password', password);
  return database.transaction(async (transaction) => {
    // the person first, as everywhere: two orders of locks would end in a deadlock
    await person.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE });
    const now = new Date();
    const [used] = await SingleUseLink.update(
      { usedAt: now },
      { where: { id: link.id, usedAt: null, expiresAt: { [Op.gt]: now } }, transaction },
    );
    if (used !== 1) throw new AppError('link-spent');
    await setPassword(person, passwordHash, ACTIONS[link.purpose], transaction);
    return person;
  });
}
