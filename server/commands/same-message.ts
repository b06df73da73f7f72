import { isDeepStrictEqual } from 'node:util';
import { UniqueConstraintError, type Sequelize, type Transaction } from 'sequelize';
import type { Matter } from '../../shared/schemas/matter-answers.ts';
import { AppError } from '../errors.ts';

type Written = {
  readonly text: string;
  readonly photographs?: readonly { readonly id: string; readonly caption: string }[];
};

function announced({ photographs = [] }: Written) {
  return photographs.map(({ id, caption }) => [id, caption]);
}

/** Whether a message that is kept says what was sent again. */
export function isSameMessage(
  kept: Matter['messages'][number] | undefined,
  sent: Written,
): boolean {
  return kept?.text === sent.text && isDeepStrictEqual(announced(kept), announced(sent));
}

/** The refusal of something else under a number that is there. */
export function otherMessage(): AppError {
  return new AppError('already-exists', 'Something else is kept under this number already.');
}

/** A transaction that keeps something under a number that a browser made: refused where that is taken. */
export async function numberedByOthers<T>(
  database: Sequelize,
  work: (transaction: Transaction) => Promise<T>,
): Promise<T> {
  try {
    return await database.transaction(work);
  } catch (error) {
    throw error instanceof UniqueConstraintError ? otherMessage() : error;
  }
}
