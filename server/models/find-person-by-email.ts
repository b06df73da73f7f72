import { col, fn, where, type Transaction } from 'sequelize';
import { Person } from './person.ts';

/** The person of an address; capitals make no other person. */
export function findPersonByEmail(
  email: string,
  transaction: Transaction | null = null,
): Promise<Person | null> {
  const isTheirs = where(fn('lower', col('email')), email.trim().toLowerCase());
  return Person.findOne({ where: isTheirs, transaction });
}
