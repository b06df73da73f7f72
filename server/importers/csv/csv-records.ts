import { Readable } from 'node:stream';
import { CsvError, parse } from 'csv-parse';
import { z } from 'zod';
import { AppError } from '../../errors.ts';
import { isBlank, tooWide, type TableRecord } from '../table-rows.ts';

const CHUNK = 256 * 1024;
/** The longest footprint, written with all its figures, and the values beside it. */
const LONGEST_RECORD = 2 * 1024 * 1024;
/** Blank ones behind the last column may be some more. */
const MOST_VALUES = 1000;
const recordSchema = z.array(z.string());
const placeSchema = z.object({ records: z.number() });

function refusal(error: CsvError): AppError {
  const row = (placeSchema.safeParse(error).data?.records ?? 0) + 1;
  if (error.code === 'CSV_MAX_RECORD_SIZE') {
    const message = `Row ${row} is longer than 2 MB. Its end is missing, or it is no table.`;
    return new AppError('unreadable', message);
  }
  if (error.code === 'CSV_QUOTE_NOT_CLOSED') {
    const message = `A quotation mark in row ${row} is not closed: the file may be cut off.`;
    return new AppError('unreadable', message);
  }
  return new AppError('unreadable', `Row ${row} is not CSV: a quotation mark is out of place.`);
}

function narrowRecord(record: string[]): string[] {
  if (record.length > MOST_VALUES) throw tooWide(record.length);
  return record;
}

function* chunksOf(text: Buffer): Generator<Buffer> {
  for (let at = 0; at < text.length; at += CHUNK) yield text.subarray(at, at + CHUNK);
}

/** The records of a CSV file that are not blank, numbered from 1 with the heading. */
export async function* csvRecords(text: Buffer, delimiter: string): AsyncGenerator<TableRecord> {
  const parser = Readable.from(chunksOf(text)).pipe(
    parse({
      delimiter,
      relax_column_count: true,
      relax_quotes: true,
      max_record_size: LONGEST_RECORD,
      // asked at once: the parser reads some records ahead
      on_record: narrowRecord,
    }),
  );
  let row = 0;
  try {
    for await (const record of parser) {
      row += 1;
      const values = recordSchema.parse(record);
      if (!values.every(isBlank)) yield { row, values };
    }
  } catch (error) {
    throw error instanceof CsvError ? refusal(error) : error;
  } finally {
    parser.destroy();
  }
}
