import type { PartyImportRow } from '../../shared/schemas/party-imports.ts';
import { csvCell } from './csv-cell.ts';

/** Spreadsheets take a file for UTF-8 by this mark. */
const MARK = '\uFEFF';
const HEADING = ['Row', 'Building', 'Name', 'Comes to', 'Remarks'];

function line(cells: readonly (string | number | null)[]): string {
  return `${cells.map(csvCell).join(',')}\r\n`;
}

/** The report of an import of parties as CSV, in the order of the file. */
export function partyImportReport(rows: readonly PartyImportRow[]): string {
  const lines = rows.map(({ row, reference, name, outcome, remarks }) =>
    line([row, reference, name, outcome, remarks.join(' ')]),
  );
  return [MARK + line(HEADING), ...lines].join('');
}
