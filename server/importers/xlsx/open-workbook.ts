import { AppError } from '../../errors.ts';
import type { Source, SourceRow } from '../source.ts';
import { headingOf, isBlank, tableRow, type Heading, type TableRecord } from '../table-rows.ts';
import type { ZipEntry } from '../zip-entries.ts';
import { dateStyles } from './date-styles.ts';
import { sharedTexts } from './shared-texts.ts';
import { sheetRows, type CellKey, type Merged } from './sheet-rows.ts';
import { sheetsOf, type Sheet } from './workbook-parts.ts';

const SAMPLED = 200;

type Found = { readonly sheet: Sheet; readonly names: TableRecord; readonly heading: Heading };

function filled({ values }: TableRecord): number {
  return values.filter((value) => !isBlank(value)).length;
}

/** A row of names holds texts in two cells or more; titles above a table stand in one. */
function isHeading(record: TableRecord): boolean {
  const texts = record.values.filter((value) => typeof value === 'string' && !isBlank(value));
  return texts.length > 1 && texts.length === filled(record);
}

async function headingIn(sheet: Sheet, key: CellKey): Promise<Found | undefined> {
  let names: TableRecord | undefined;
  const sample: TableRecord[] = [];
  for await (const record of sheetRows(sheet, key)) {
    if (names !== undefined) sample.push(record);
    else if (isHeading(record)) names = record;
    if (sample.length >= SAMPLED) break;
  }
  if (names === undefined) return undefined;
  return { sheet, names, heading: headingOf(names.values, sample) };
}

function refuseMerged(merged: readonly Merged[], row: number, sheet: string): void {
  const one = merged.find(({ first, last }) => first <= row && row <= last);
  if (one === undefined) return;
  const message = `In sheet "${sheet}" the cells ${one.name} of the heading are merged. Give each column a name of its own.`;
  throw new AppError('unreadable', message);
}

async function* rowsOf(found: Found, key: CellKey): AsyncGenerator<SourceRow> {
  const { sheet, names, heading } = found;
  const sawMerged = (merged: readonly Merged[]) => {
    refuseMerged(merged, names.row, sheet.name);
  };
  for await (const record of sheetRows(sheet, key, sawMerged)) {
    if (record.row > names.row) yield tableRow(heading, record);
  }
}

/** Reads the first sheet of a workbook that has a row with names of columns. */
export async function openWorkbook(bytes: Buffer, entries: readonly ZipEntry[]): Promise<Source> {
  const parts = { bytes, entries };
  const { sheets, from1904 } = await sheetsOf(parts);
  const [texts, isDate] = [await sharedTexts(parts), await dateStyles(parts)];
  const key: CellKey = { bytes, texts, isDate, from1904 };
  for (const sheet of sheets) {
    const found = await headingIn(sheet, key);
    if (found === undefined) continue;
    const { columns, wkt, crs } = found.heading;
    return {
      format: 'xlsx',
      kind: wkt === undefined ? 'values' : 'footprints',
      layer: sheet.name,
      crs,
      notes: [],
      columns: columns.filter((_, index) => index !== wkt),
      rows: () => rowsOf(found, key),
    };
  }
  throw new AppError('unreadable', 'No sheet of the workbook has a row with names of columns.');
}
