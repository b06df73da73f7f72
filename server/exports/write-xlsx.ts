import type { Writable } from 'node:stream';
import { setImmediate } from 'node:timers/promises';
import Excel from 'exceljs';
import { headingOf, kindOf, valueOf, type ExportJob } from './export-job.ts';

/** So many rows go out between pauses in which others are served. */
const AT_ONCE = 500;
const WIDTHS = { text: 24, number: 14, whole: 10 } as const;

function addAbout(book: Excel.stream.xlsx.WorkbookWriter, { about }: ExportJob): void {
  const sheet = book.addWorksheet('About');
  sheet.columns = [{ width: 16 }, { width: 90 }];
  for (const [label, words] of about) {
    const row = sheet.addRow([label, words]);
    row.getCell(1).font = { bold: true };
    row.getCell(2).alignment = { wrapText: true, vertical: 'top' };
    row.commit();
  }
  sheet.commit();
}

/** The register as a workbook, written while it is read: numbers are numbers, the heading stays in sight. */
export async function writeXlsx(job: ExportJob, to: Writable): Promise<void> {
  const { columns, buildings } = job;
  const book = new Excel.stream.xlsx.WorkbookWriter({ stream: to, useStyles: true });
  const sheet = book.addWorksheet('Register', { views: [{ state: 'frozen', ySplit: 1 }] });
  sheet.columns = columns.map((column) => ({ width: WIDTHS[kindOf(column)] }));
  const heading = sheet.addRow(columns.map(headingOf));
  heading.font = { bold: true };
  heading.commit();
  let written = 0;
  for await (const { building } of buildings) {
    sheet.addRow(columns.map((column) => valueOf(building, column))).commit();
    written += 1;
    if (written % AT_ONCE > 0) continue;
    if (to.writableNeedDrain) await new Promise((resolve) => to.once('drain', resolve));
    else await setImmediate();
  }
  sheet.commit();
  addAbout(book, job);
  await book.commit();
}
