import { csvCell } from '../documents/csv-cell.ts';
import type { ExportFile, ExportValue } from './export-file.ts';

/** Tells spreadsheets that the letters are UTF-8. */
const MARK = '\uFEFF';

function line(cells: readonly ExportValue[]): string {
  return `${cells.map(csvCell).join(',')}\r\n`;
}

/** Buildings as CSV, piece by piece. */
export async function* csvText<Row>({ columns, rows }: ExportFile<Row>): AsyncGenerator<string> {
  yield MARK + line(columns.map(({ heading }) => heading));
  for await (const { row } of rows) yield line(columns.map(({ cell }) => cell(row)));
}
