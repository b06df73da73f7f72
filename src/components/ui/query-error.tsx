import { ApiError } from '../../lib/api-error.ts';
import { Button } from './button.tsx';
import { ErrorNote } from './error-note.tsx';

type QueryErrorProps = {
  /** What did not come, as `The list of people`. */
  readonly what: string;
  readonly error: Error;
  readonly onRetry: () => void;
};

/** Something could not be fetched. */
export function QueryError({ what, error, onRetry }: QueryErrorProps) {
  const because = error instanceof ApiError ? error.message : 'Something failed on this page.';
  return (
    <ErrorNote
      failed={`${what} did not come.`}
      stands={`${because} Nothing was changed.`}
      action={<Button onClick={onRetry}>Try again</Button>}
    />
  );
}
