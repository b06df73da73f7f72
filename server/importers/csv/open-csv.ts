import { AppError } from '../../errors.ts';
import type { Source, SourceRow } from '../source.ts';
import { headingOf, tableRow, type Heading, type TableRecord } from '../table-rows.ts';
import { csvRecords } from './csv-records.ts';
import { findDelimiter } from './find-delimiter.ts';

const SAMPLED = 200;

async function* rowsOf(
  records: AsyncIterable<TableRecord>,
  heading: Heading,
): AsyncGenerator<SourceRow> {
  let isHeading = true;
  for await (const record of records) {
    if (!isHeading) yield tableRow(heading, record);
    isHeading = false;
  }
}

/** Reads CSV in UTF-8: values by reference, or footprints where a column holds well-known text. */
export async function openCsv(text: Buffer): Promise<Source> {
  const { delimiter, start } = findDelimiter(text);
  const records = () => csvRecords(text.subarray(start), delimiter);
  const sample: TableRecord[] = [];
  for await (const record of records()) {
    sample.push(record);
    if (sample.length > SAMPLED) break;
  }
  const [names, ...rest] = sample;
  if (names === undefined) throw new AppError('unreadable', 'The file holds no rows.');
  const heading = headingOf(names.values, rest);
  return {
    format: 'csv',
    kind: heading.wkt === undefined ? 'values' : 'footprints',
    layer: null,
    crs: heading.crs,
    notes: [],
    columns: heading.columns.filter((_, index) => index !== heading.wkt),
    rows: () => rowsOf(records(), heading),
  };
}
