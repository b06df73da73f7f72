import { useEffect, useRef, type ReactNode } from 'react';
import { ApiError, type FieldFault } from '../../lib/api-error.ts';
import { ErrorNote } from './error-note.tsx';

type MutationErrorProps = {
  /** What was not done, as `The scheme was not made.` */
  readonly failed: string;
  readonly error: Error | null;
  /** Names of fields beside which their faults stand already. */
  readonly shown?: readonly string[];
  /** What still stands, where this form knows it better than the server. */
  readonly stands?: string | undefined;
  /** What can be done about it. */
  readonly action?: ReactNode;
};

/** More are read line by line. */
const MOST_IN_A_SENTENCE = 2;

type FaultListProps = Pick<MutationErrorProps, 'action'> & {
  readonly faults: readonly FieldFault[];
};

/** What is wrong line by line, then what can be done about it. */
function FaultList({ faults, action }: FaultListProps) {
  return (
    <>
      <ul
        aria-label="What is wrong"
        tabIndex={0}
        className="max-h-60 overflow-auto border-t border-rule text-small"
      >
        {faults.map(({ path, message }, k) => (
          <li key={`${path} ${k}`} className="border-b border-hairline py-1">
            {message}
          </li>
        ))}
      </ul>
      {action !== undefined && <div className="mt-2">{action}</div>}
    </>
  );
}

function leftOver(error: Error | null, shown: readonly string[]) {
  if (!(error instanceof ApiError)) return { left: [], isAllShown: false };
  const left = error.fields.filter(({ path }) => !shown.includes(path));
  return { left, isAllShown: error.fields.length > 0 && left.length === 0 };
}

/**
 * Something was not done. What a field says already is not said again, and the focus is left to the field;
 * otherwise it comes here, for the note may stand far from the button that was pressed.
 */
export function MutationError(props: MutationErrorProps) {
  const { failed, error, shown = [], stands, action } = props;
  const note = useRef<HTMLDivElement>(null);
  const { left, isAllShown } = leftOver(error, shown);
  useEffect(() => {
    if (error !== null && !isAllShown) note.current?.focus();
  }, [error, isAllShown]);
  if (error === null || error.name === 'AbortError') return null;
  if (!(error instanceof ApiError)) return <ErrorNote ref={note} failed={failed} />;
  if (isAllShown) return <ErrorNote failed={failed} stands="Mend what is marked." />;
  const isList = left.length > MOST_IN_A_SENTENCE;
  const words = [stands ?? error.message, ...(isList ? [] : left.map(({ message }) => message))];
  return (
    <ErrorNote
      ref={note}
      failed={failed}
      stands={words.join(' ')}
      action={isList ? <FaultList faults={left} action={action} /> : action}
    />
  );
}
