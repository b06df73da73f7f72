import { faultsOfMarks, type LetterWords } from '../../shared/presentation/letter-text.ts';
import { AppError } from '../errors.ts';

/** Refuses a letter whose marks are not known, or stand where they may not; `at` is where it stands in what was asked. */
export function refuseBadMarks({ subject, body }: LetterWords, at = ''): void {
  const fields = [
    ...faultsOfMarks(subject).map((message) => ({ path: `${at}subject`, message })),
    ...faultsOfMarks(body).map((message) => ({ path: `${at}body`, message })),
  ];
  if (fields.length > 0) throw new AppError('invalid-input', undefined, fields);
}
