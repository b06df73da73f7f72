import { UniqueConstraintError } from 'sequelize';
import { AppError } from '../errors.ts';

/** Saves a scheme; a name that another one has, archived ones aside, is refused. */
export async function withOwnName<T>(save: () => Promise<T>): Promise<T> {
  try {
    return await save();
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    const message = 'There is a scheme of this name.';
    throw new AppError('already-exists', message, [{ path: 'name', message }]);
  }
}
