import { IMPORT_LIMITS } from '../../shared/schemas/imports.ts';
import { AppError } from '../errors.ts';
import { pacedRows } from './paced-rows.ts';
import type { Source } from './source.ts';
import { uploadRow } from './upload-row.ts';
import type { UploadRow } from './upload.ts';

export type Survey = {
  readonly count: number;
  readonly columns: readonly string[];
  /** Rows that begin where no longitude and latitude are. */
  readonly offGlobe: number;
};

const LONGEST_NAME = 300;

function refuseUseless(count: number, faulty: number, first: UploadRow | undefined): void {
  if (count === 0) throw new AppError('unreadable', 'The file holds no rows.');
  if (faulty < count || first === undefined) return;
  const rows = count === 1 ? 'its one row' : `none of its ${count.toLocaleString('en-GB')} rows`;
  const message =
    count === 1
      ? `Nothing can be taken from the file. Of ${rows}: ${first.fault ?? ''}`
      : `Nothing can be taken from the file: ${rows} is right. Row ${first.row}: ${first.fault ?? ''}`;
  throw new AppError('unreadable', message);
}

function addColumns(columns: Set<string>, { properties }: UploadRow): void {
  for (const name of Object.keys(properties)) {
    if (columns.has(name)) continue;
    if (name.length > LONGEST_NAME) {
      const message = 'A column has a name of more than 300 letters. Give it a shorter one.';
      throw new AppError('unreadable', message);
    }
    columns.add(name);
  }
  if (columns.size > IMPORT_LIMITS.columns) {
    const message = `The rows have more than ${IMPORT_LIMITS.columns} columns. Leave out those that are not needed.`;
    throw new AppError('too-large', message);
  }
}

function isOffGlobe({ geometry }: UploadRow): boolean {
  const [x, y] = geometry?.[0]?.[0]?.[0] ?? [0, 0];
  return Math.abs(x) > 360 || Math.abs(y) > 90;
}

/** Looks through all rows once: how many, which columns, and whether any is of use. */
export async function survey(source: Source): Promise<Survey> {
  const columns = new Set<string>(source.columns);
  let [count, faulty, offGlobe] = [0, 0, 0];
  let first: UploadRow | undefined;
  for await (const given of pacedRows(source)) {
    const row = uploadRow(source.kind, given);
    count += 1;
    addColumns(columns, row);
    if (isOffGlobe(row)) offGlobe += 1;
    if (row.fault === null) continue;
    faulty += 1;
    first ??= row;
  }
  refuseUseless(count, faulty, first);
  return { count, columns: [...columns], offGlobe };
}
