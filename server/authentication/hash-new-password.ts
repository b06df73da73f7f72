import { isOwnEmail } from '../../shared/schemas/passwords.ts';
import { AppError } from '../errors.ts';
import type { Person } from '../models/person.ts';
import { hashPassword } from './password-hash.ts';

/** The hash of a password that a person chose in a field of a form; not of their own address. */
export function hashNewPassword(
  person: Pick<Person, 'email'>,
  field: string,
  password: string,
): Promise<string> {
  if (!isOwnEmail(password, person.email)) return hashPassword(password);
  const fault = { path: field, message: 'Use something else than your e-mail address.' };
  throw new AppError('invalid-input', undefined, [fault]);
}
