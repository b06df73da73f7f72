import type { Sequelize } from 'sequelize';
import { BUILDING_FIELDS } from '../../shared/schemas/building-fields.ts';
import type { ImportRow } from '../../shared/schemas/imports.ts';
import { findReportAfter } from '../models/import-report.ts';
import { csvCell } from './csv-cell.ts';

const AT_ONCE = 2000;
/** Spreadsheets take a file for UTF-8 by this mark. */
const MARK = '\uFEFF';
const HEADING = ['Row', 'Reference', 'Outcome', 'Area m²', 'Remarks', 'Changes'];

function labelOf(field: string): string {
  const facts = Object.entries(BUILDING_FIELDS).find(([name]) => name === field)?.[1];
  return facts?.label ?? (field === 'footprint' ? 'Footprint area m²' : field);
}

function changeInWords(change: ImportRow['changes'][number]): string {
  const { field, ours, theirs, isConflict, isKept } = change;
  const fate = isConflict ? ', changed in both' : isKept ? ', kept as it is' : '';
  return `${labelOf(field)}: ${ours ?? 'unknown'} → ${theirs ?? 'unknown'}${fate}`;
}

function line(cells: readonly (string | number | null)[]): string {
  return `${cells.map(csvCell).join(',')}\r\n`;
}

function lineOf({ row, reference, outcome, area, remarks, changes }: ImportRow): string {
  const rounded = area === null ? null : Math.round(area * 100) / 100;
  const told = [remarks.join(' '), changes.map(changeInWords).join('; ')];
  return line([row, reference, outcome, rounded, ...told]);
}

/** The report of an import as CSV: every row with a remark or a change, in the file's order. */
export async function* importReport(database: Sequelize, importId: string): AsyncGenerator<string> {
  yield MARK + line(HEADING);
  let after = -1;
  for (;;) {
    const rows = await findReportAfter(database, importId, after, AT_ONCE);
    const last = rows.at(-1);
    if (last === undefined) return;
    yield rows.map(lineOf).join('');
    after = last.row;
  }
}
