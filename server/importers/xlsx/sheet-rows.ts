import { AppError } from '../../errors.ts';
import type { Scalar } from '../source.ts';
import { isBlank, type TableRecord } from '../table-rows.ts';
import { unpackChunks } from '../unpack-entry.ts';
import { isoDate } from './date-styles.ts';
import { readXml, type XmlEvent } from './read-xml.ts';
import type { Sheet } from './workbook-parts.ts';

export type CellKey = {
  readonly bytes: Buffer;
  readonly texts: readonly string[];
  readonly isDate: readonly boolean[];
  readonly from1904: boolean;
};

/** A merged stretch of one row or more, wider than a column. */
export type Merged = { readonly first: number; readonly last: number; readonly name: string };

type Cell = { column: number; type: string; style: number; text: string };

/** Filled columns right of these are refused by whoever makes a table of the rows. */
const MOST_COLUMNS = 1000;
const LETTERS = 26;

function columnOf(reference: string): number | undefined {
  const letters = /^([A-Z]{1,3})\d+$/i.exec(reference)?.[1]?.toUpperCase();
  if (letters === undefined) return undefined;
  let column = 0;
  for (const letter of letters) column = column * LETTERS + letter.charCodeAt(0) - 64;
  return column - 1;
}

function valueOf({ type, style, text }: Cell, key: CellKey): Scalar {
  if (text === '' || type === 'e') return null;
  if (type === 's') return key.texts[Number(text)] ?? null;
  if (type === 'str' || type === 'inlineStr' || type === 'd') return text;
  if (type === 'b') return text.trim() === '1';
  const number = Number(text);
  if (!Number.isFinite(number)) return null;
  return key.isDate[style] === true ? (isoDate(number, key.from1904) ?? number) : number;
}

/** Puts together the cells of a sheet, event by event. */
class SheetReader {
  readonly merged: Merged[] = [];
  private values: Scalar[] = [];
  private row = 0;
  private next = 0;
  private cell: Cell | undefined;
  private isValue = false;
  private isSpoken = false;

  constructor(private readonly key: CellKey) {}

  /** Takes an event in; gives a row when its end is reached. */
  take(event: XmlEvent): TableRecord | undefined {
    if (event.kind === 'text') this.addText(event.text);
    else if (event.kind === 'open') this.open(event.name, event.attributes);
    else return this.close(event.name);
    return undefined;
  }

  private addText(text: string): void {
    if (this.isValue && !this.isSpoken && this.cell !== undefined) this.cell.text += text;
  }

  private open(name: string, attributes: Readonly<Record<string, string>>): void {
    if (name === 'row') {
      const given = Number(attributes.r);
      this.row = Number.isInteger(given) && given > 0 ? given : this.row + 1;
      [this.values, this.next] = [[], 0];
    } else if (name === 'c') {
      const column = columnOf(attributes.r ?? '') ?? this.next;
      const [type, style] = [attributes.t ?? 'n', Number(attributes.s ?? 0)];
      this.cell = { column, type, style, text: '' };
      this.next = column + 1;
    } else if (name === 'v' || name === 't') this.isValue = true;
    else if (name === 'rPh') this.isSpoken = true;
    else if (name === 'mergeCell') this.merge(attributes.ref ?? '');
  }

  private close(name: string): TableRecord | undefined {
    if (name === 'v' || name === 't') this.isValue = false;
    else if (name === 'rPh') this.isSpoken = false;
    else if (name === 'c') this.endCell();
    else if (name === 'row' && !this.values.every(isBlank)) {
      return { row: this.row, values: this.values };
    }
    return undefined;
  }

  private endCell(): void {
    const { cell } = this;
    this.cell = undefined;
    const value = cell && valueOf(cell, this.key);
    if (cell === undefined || value === undefined || value === null) return;
    if (cell.column >= MOST_COLUMNS) {
      const message = `Row ${this.row} of the sheet has values in column ${cell.column + 1}. At most 200 columns are taken.`;
      throw new AppError('too-large', message);
    }
    while (this.values.length < cell.column) this.values.push(null);
    this.values[cell.column] = value;
  }

  private merge(name: string): void {
    const [, first, last] = /^\$?[A-Z]+\$?(\d+):\$?[A-Z]+\$?(\d+)$/i.exec(name) ?? [];
    const [from = '', to = ''] = name.split(':').map((one) => one.replace(/\d+$/, ''));
    if (from === to || this.merged.length > MOST_COLUMNS) return;
    this.merged.push({ first: Number(first), last: Number(last), name });
  }
}

/** The rows of a sheet that hold anything; at the end `sawMerged` is told which cells are merged. */
export async function* sheetRows(
  { name, entry }: Sheet,
  key: CellKey,
  sawMerged: (merged: readonly Merged[]) => void = () => undefined,
): AsyncGenerator<TableRecord> {
  const reader = new SheetReader(key);
  for await (const events of readXml(name, unpackChunks(key.bytes, entry))) {
    for (const event of events) {
      const row = reader.take(event);
      if (row !== undefined) yield row;
    }
  }
  sawMerged(reader.merged);
}
