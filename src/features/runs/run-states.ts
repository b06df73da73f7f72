import { isUnderWay, type RunAnswer } from '../../../shared/schemas/runs.ts';

/** Whether a run is still being worked out. */
export function isActive({ state }: Pick<RunAnswer, 'state'>): boolean {
  return isUnderWay(state);
}

/** Whether a run ended before everything was worked out. */
export function isStopped({ state }: Pick<RunAnswer, 'state'>): boolean {
  return state === 'cancelled' || state === 'failed';
}

/** The runs that can be looked at, the newest first. */
export function completeOf(runs: readonly RunAnswer[]): readonly RunAnswer[] {
  return runs.filter(({ state }) => state === 'complete');
}
