import type { Check, CheckRow } from '../../../../shared/checks/check.ts';
import { METHOD_VERSION } from '../../../../shared/method-version.ts';
import type { ReferenceKey } from '../../../../shared/references.ts';

/** A check that has been run. */
export type CheckDone = {
  readonly id: string;
  readonly name: string;
  readonly source: ReferenceKey;
  readonly provenance: string;
  readonly rows: readonly CheckRow[];
};

/** All checks, run at one time, by one version of the method. */
export type ChecksDone = {
  readonly checks: readonly CheckDone[];
  readonly milliseconds: number;
  readonly methodVersion: string;
};

/** Runs checks one after the other; `now` tells the time in milliseconds. */
export function runChecks(checks: readonly Check[], now: () => number): ChecksDone {
  const start = now();
  const done = checks.map(({ id, name, source, provenance, run }) => {
    return { id, name, source, provenance, rows: run() };
  });
  return { checks: done, milliseconds: now() - start, methodVersion: METHOD_VERSION };
}

/** How many figures agree, of how many. */
export function agreement(checks: readonly Pick<CheckDone, 'rows'>[]) {
  const rows = checks.flatMap((check) => check.rows);
  return { agreeing: rows.filter(({ agrees }) => agrees).length, all: rows.length };
}
