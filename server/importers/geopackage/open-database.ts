import { createRequire } from 'node:module';
import initSqlJs, { type Database, type SqlValue } from 'sql.js';
import { AppError } from '../../errors.ts';

export type Values = readonly SqlValue[];

const require = createRequire(import.meta.url);
const HEADING = 100;
/** How a database says that its last changes lie in a file beside it, which an upload has not. */
const [WRITE_VERSION_AT, READ_VERSION_AT, JOURNAL] = [18, 19, 1];

export function damaged(): AppError {
  return new AppError('unreadable', 'The GeoPackage cannot be read: the file is damaged.');
}

function checkLength(bytes: Buffer): void {
  if (bytes.length < HEADING) throw damaged();
  const given = bytes.readUInt16BE(16);
  const page = given === 1 ? 65_536 : given;
  const pages = bytes.readUInt32BE(28);
  // the count holds only where both counters agree
  const isCounted = bytes.readUInt32BE(24) === bytes.readUInt32BE(92);
  if (isCounted && page * pages > bytes.length) {
    const message = 'The GeoPackage cannot be read: the end of the file is missing. Send it again.';
    throw new AppError('unreadable', message);
  }
}

/** A name as SQL takes it. */
export function quoted(name: string): string {
  return `"${name.replaceAll('"', '""')}"`;
}

/** Opens a database in memory. Whoever opens it closes it. */
export async function openDatabase(bytes: Buffer): Promise<Database> {
  checkLength(bytes);
  const { Database: SqlDatabase } = await initSqlJs({
    locateFile: () => require.resolve('sql.js/dist/sql-wasm.wasm'),
  });
  const copy = new Uint8Array(bytes);
  copy[WRITE_VERSION_AT] = JOURNAL;
  copy[READ_VERSION_AT] = JOURNAL;
  return new SqlDatabase(copy);
}

/** The rows of a query, one after another. */
export function* query(
  database: Database,
  sql: string,
  given: readonly (string | number)[] = [],
): Generator<Values> {
  try {
    const statement = database.prepare(sql, [...given]);
    try {
      while (statement.step()) yield statement.get();
    } finally {
      statement.free();
    }
  } catch (error) {
    throw error instanceof AppError ? error : damaged();
  }
}
