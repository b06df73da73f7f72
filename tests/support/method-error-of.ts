import { MethodError } from '../../shared/method-error.ts';

/** The code and field of the refusal that a call ends in; fails where it does not refuse. */
export function methodErrorOf(call: () => unknown): { code: string; field: string | undefined } {
  try {
    call();
  } catch (error) {
    if (error instanceof MethodError) return { code: error.code, field: error.field };
    throw error;
  }
  throw new Error('It was not refused.');
}
