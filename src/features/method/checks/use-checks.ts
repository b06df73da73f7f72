import { useEffect, useState } from 'react';
import { runChecksInThread } from './open-checks-worker.ts';
import type { ChecksDone } from './run-checks.ts';

/** How the running of the checks stands; what was there before stays until the next is done. */
export type ChecksState = {
  readonly done: ChecksDone | null;
  readonly isRunning: boolean;
  readonly hasFailed: boolean;
};

const RUNNING: ChecksState = { done: null, isRunning: true, hasFailed: false };

/** Runs the checks when the page opens, and again on demand. */
export function useChecks(): ChecksState & { readonly runAgain: () => void } {
  const [turn, setTurn] = useState(0);
  const [state, setState] = useState(RUNNING);
  useEffect(
    () =>
      runChecksInThread({
        onDone: (done) => {
          setState({ done, isRunning: false, hasFailed: false });
        },
        onFault: () => {
          setState((now) => ({ ...now, isRunning: false, hasFailed: true }));
        },
      }),
    [turn],
  );
  return {
    ...state,
    runAgain: () => {
      setState((now) => ({ ...now, isRunning: true, hasFailed: false }));
      setTurn((now) => now + 1);
    },
  };
}
