import { UniqueConstraintError } from 'sequelize';
import { AppError } from '../errors.ts';

/** Saves something whose name is its own; one that another has, archived schemes aside, is refused. */
export async function withOwnName<T>(
  save: () => Promise<T>,
  thing: 'a scheme' | 'an option' | 'a layout' = 'a scheme',
): Promise<T> {
  try {
    return await save();
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    const message = `There is ${thing} of this name.`;
    throw new AppError('already-exists', message, [{ path: 'name', message }]);
  }
}
