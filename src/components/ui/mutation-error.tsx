import { ApiError } from '../../lib/api-error.ts';
import { ErrorNote } from './error-note.tsx';

type MutationErrorProps = {
  /** What was not done, as `The scheme was not made.` */
  readonly failed: string;
  readonly error: Error | null;
  /** Names of fields beside which their faults stand already. */
  readonly shown?: readonly string[];
};

/** Something was not done. What a field says already is not said again. */
export function MutationError({ failed, error, shown = [] }: MutationErrorProps) {
  if (error === null || error.name === 'AbortError') return null;
  if (!(error instanceof ApiError)) return <ErrorNote failed={failed} />;
  const left = error.fields.filter(({ path }) => !shown.includes(path));
  if (error.fields.length > 0 && left.length === 0) {
    return <ErrorNote failed={failed} stands="Mend what is marked." />;
  }
  const words = [error.message, ...left.map(({ message }) => message)];
  return <ErrorNote failed={failed} stands={words.join(' ')} />;
}
