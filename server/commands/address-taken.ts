import { AppError } from '../errors.ts';

/** The refusal of an e-mail address that is somebody's. */
export function addressTaken(): AppError {
  const message = 'Somebody has this address already.';
  return new AppError('already-exists', message, [{ path: 'email', message }]);
}
