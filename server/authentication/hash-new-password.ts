import { isOwnEmail } from '../../shared/schemas/passwords.ts';
import { AppError } from '../errors.ts';
import type { Person } from '../models/person.ts';
import { isCommonPassword } from './is-common-password.ts';
import { hashPassword } from './password-hash.ts';

/** A shorter name than this stands in many a word. */
const NAME_THAT_TELLS = 4;

function faultOf(password: string, email: string): string | undefined {
  if (isOwnEmail(password, email)) return 'Use something else than your e-mail address.';
  const name = email.slice(0, email.lastIndexOf('@')).toLowerCase();
  if (name.length >= NAME_THAT_TELLS && password.toLowerCase().includes(name)) {
    return 'Leave the name of your e-mail address out of it.';
  }
  return isCommonPassword(password) ? 'This is one of the first that anybody tries.' : undefined;
}

/** The hash of a password that a person chose in a field of a form; not one that is easily guessed. */
export function hashNewPassword(
  person: Pick<Person, 'email'>,
  field: string,
  password: string,
): Promise<string> {
  const message = faultOf(password, person.email);
  if (message === undefined) return hashPassword(password);
  throw new AppError('invalid-input', undefined, [{ path: field, message }]);
}
