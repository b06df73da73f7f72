import { col, fn, where } from 'sequelize';
import { Person } from './person.ts';

/** The person of an address; capitals make no other person. */
export function findPersonByEmail(email: string): Promise<Person | null> {
  return Person.findOne({ where: where(fn('lower', col('email')), email.trim().toLowerCase()) });
}
