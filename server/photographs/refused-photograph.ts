import { AppError } from '../errors.ts';

/** Why a file is not taken for a photograph. */
export function notAPhotograph(): AppError {
  return new AppError(
    'unreadable',
    'This is no photograph: only JPEG, PNG and WebP pictures are taken.',
  );
}

/** A picture that breaks off or says what cannot be. */
export function damagedPhotograph(): AppError {
  return new AppError('unreadable', 'The photograph is damaged. Take it or choose it again.');
}
