import { Op, type Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import { Person } from '../models/person.ts';

/**
 * Refuses to leave nobody who can sign in and give roles. The lock makes two who remove each other take
 * turns.
 */
export async function requireAnotherAdministrator(
  person: Person,
  transaction: Transaction,
): Promise<void> {
  const administrators = await Person.findAll({
    where: { isAdministrator: true, passwordHash: { [Op.ne]: null }, shutOutAt: null },
    order: ['id'],
    lock: transaction.LOCK.NO_KEY_UPDATE,
    transaction,
  });
  if (administrators.some(({ id }) => id !== person.id)) return;
  throw new AppError('conflict', 'Nobody else is administrator. Make somebody one first.');
}
