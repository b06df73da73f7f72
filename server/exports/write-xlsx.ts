import type { Writable } from 'node:stream';
import { setImmediate } from 'node:timers/promises';
import Excel from 'exceljs';
import type { BesideSheet, ExportFile, SheetColumn } from './export-file.ts';

type Book = Excel.stream.xlsx.WorkbookWriter;

/** So many rows go out between pauses in which others are served. */
const AT_ONCE = 500;
const WIDTHS = { text: 24, number: 14, whole: 10 } as const;

function styleOf({ kind, digits }: SheetColumn): Partial<Excel.Column> {
  const width = WIDTHS[kind];
  return digits === undefined || digits === 0
    ? { width }
    : { width, style: { numFmt: `0.${'0'.repeat(digits)}` } };
}

/** A sheet whose heading stays in sight. */
function addSheet(book: Book, title: string, columns: readonly SheetColumn[]): Excel.Worksheet {
  const sheet = book.addWorksheet(title, { views: [{ state: 'frozen', ySplit: 1 }] });
  sheet.columns = columns.map(styleOf);
  const heading = sheet.addRow(columns.map((column) => column.heading));
  heading.font = { bold: true };
  heading.commit();
  return sheet;
}

function addAbout<Row>(book: Book, { aboutTitle, about }: ExportFile<Row>): void {
  const sheet = book.addWorksheet(aboutTitle);
  sheet.columns = [{ width: 28 }, { width: 90 }];
  for (const [label, value] of about) {
    const row = sheet.addRow([label, value]);
    row.getCell(1).font = { bold: true };
    row.getCell(1).alignment = { vertical: 'top' };
    row.getCell(2).alignment = { wrapText: true, vertical: 'top', horizontal: 'left' };
    row.commit();
  }
  sheet.commit();
}

function addBeside(book: Book, { title, columns, rows }: BesideSheet): void {
  const sheet = addSheet(book, title, columns);
  for (const row of rows) sheet.addRow([...row]).commit();
  sheet.commit();
}

/** Buildings as a workbook, written while they are read: numbers are numbers. */
export async function writeXlsx<Row>(file: ExportFile<Row>, to: Writable): Promise<void> {
  const { title, columns, rows, beside } = file;
  const book = new Excel.stream.xlsx.WorkbookWriter({ stream: to, useStyles: true });
  const sheet = addSheet(book, title, columns);
  let written = 0;
  for await (const { row } of rows) {
    sheet.addRow(columns.map(({ cell }) => cell(row))).commit();
    written += 1;
    if (written % AT_ONCE > 0) continue;
    if (to.writableNeedDrain) await new Promise((resolve) => to.once('drain', resolve));
    else await setImmediate();
  }
  sheet.commit();
  addAbout(book, file);
  for (const one of beside) addBeside(book, one);
  await book.commit();
}
