import { setImmediate } from 'node:timers/promises';
import { IMPORT_LIMITS } from '../../shared/schemas/imports.ts';
import { AppError } from '../errors.ts';
import type { Source, SourceRow } from './source.ts';

/** Others are served between so many rows. */
const AT_ONCE = 1000;

/** The rows of a source, no more than are taken, with room for others between them. */
export async function* pacedRows({ rows }: Source): AsyncGenerator<SourceRow> {
  let count = 0;
  for await (const row of rows()) {
    count += 1;
    if (count > IMPORT_LIMITS.rows) {
      const message = 'The file holds more than 200,000 rows. Split it into several files.';
      throw new AppError('too-large', message);
    }
    if (count % AT_ONCE === 0) await setImmediate();
    yield row;
  }
}
