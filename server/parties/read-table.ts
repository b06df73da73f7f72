import {
  PARTY_COLUMNS,
  PARTY_IMPORT_LIMITS,
  type PartyColumns,
} from '../../shared/schemas/party-imports.ts';
import { AppError } from '../errors.ts';
import { guessByWords } from '../imports/guess-by-words.ts';
import { openUpload } from '../importers/open-upload.ts';
import { PARTY_COLUMN_ALIASES } from './party-words.ts';
import type { StagedRow, StagedTable } from './read-party-row.ts';

/** Reads a CSV file or a workbook as a table of texts; other files are refused with a sentence. */
export async function readTable(file: string): Promise<StagedTable> {
  const upload = await openUpload(file);
  if (upload.format !== 'csv' && upload.format !== 'xlsx') {
    throw new AppError('unreadable', 'Parties come as a table: CSV or XLSX.');
  }
  if (upload.count > PARTY_IMPORT_LIMITS.rows) {
    const message = 'The file holds more than 50,000 rows. Split it into several files.';
    throw new AppError('too-large', message);
  }
  const { columns } = upload;
  const rows: StagedRow[] = [];
  for await (const { row, fault, properties } of upload.rows()) {
    const values = columns.map((name) => String(properties[name] ?? ''));
    rows.push({ row, fault, values });
  }
  return { columns, rows };
}

/** Which column of a table holds what, guessed by its heading. */
export function guessPartyColumns({ columns, rows }: StagedTable): PartyColumns {
  const told = columns.map((name, index) => {
    return { name, filled: rows.filter(({ values }) => values[index] !== '').length };
  });
  return guessByWords(told, PARTY_COLUMNS, PARTY_COLUMN_ALIASES);
}
