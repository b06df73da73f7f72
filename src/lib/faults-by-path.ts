import { ApiError, type FieldFault } from './api-error.ts';

/** What is wrong, by the name of the field. */
export type Faults = Readonly<Record<string, string>>;

type Issue = { readonly path: readonly PropertyKey[]; readonly message: string };

function byPath(faults: readonly FieldFault[]): Faults {
  // of several at one place the first is said
  return Object.fromEntries([...faults].reverse().map(({ path, message }) => [path, message]));
}

/** What a schema finds wrong. */
export function faultsOfIssues(issues: readonly Issue[]): Faults {
  return byPath(issues.map(({ path, message }) => ({ path: path.join('.'), message })));
}

/** What the server finds wrong. */
export function faultsOfError(error: Error | null): Faults {
  return error instanceof ApiError ? byPath(error.fields) : {};
}
