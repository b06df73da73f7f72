import type { Many } from './register-edits.ts';

/** Enough for the database to be fast, few enough to hold. */
const AT_ONCE = 2000;

/** What comes one after the other, in lists of a bounded length. */
export async function* inBatches<T>(
  many: Many<T> | undefined,
  size: number = AT_ONCE,
): AsyncGenerator<T[]> {
  let batch: T[] = [];
  for await (const one of many ?? []) {
    batch.push(one);
    if (batch.length < size) continue;
    yield batch;
    batch = [];
  }
  if (batch.length > 0) yield batch;
}
