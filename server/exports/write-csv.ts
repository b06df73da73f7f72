import type { BuildingValue } from '../../shared/schemas/building-fields.ts';
import { csvCell } from '../documents/csv-cell.ts';
import { headingOf, valueOf, type ExportJob } from './export-job.ts';

/** Tells spreadsheets that the letters are UTF-8. */
const MARK = '\uFEFF';

function line(cells: readonly BuildingValue[]): string {
  return `${cells.map(csvCell).join(',')}\r\n`;
}

/** The register as CSV, piece by piece. */
export async function* csvText({ columns, buildings }: ExportJob): AsyncGenerator<string> {
  yield MARK + line(columns.map(headingOf));
  for await (const { building } of buildings) {
    yield line(columns.map((column) => valueOf(building, column)));
  }
}
