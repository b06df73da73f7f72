import { AppError } from '../../errors.ts';
import { noProperties } from '../flat-properties.ts';
import type { Properties, Scalar } from '../source.ts';
import type { CodePage } from './code-page.ts';

type Field = {
  readonly name: string;
  readonly type: string;
  readonly start: number;
  readonly length: number;
};

export type DbfTable = {
  readonly columns: readonly string[];
  readonly count: number;
  /** The values of a row, from 0; undefined where it was deleted. */
  readonly row: (index: number) => Properties | undefined;
};

const HEADING = 32;
const FIELD = 32;
const FIELDS_END = 0x0d;
const DELETED = 0x2a;
/** Longer numbers are names: as numbers they would lose their last figures. */
const MOST_FIGURES = 15;

function damaged(): AppError {
  return new AppError('unreadable', 'The table beside the shapes is damaged.');
}

/** The columns stand one after another behind a mark of one byte. */
function fieldsOf(dbf: Buffer, headingLength: number, decode: CodePage['decode']): Field[] {
  const fields: Field[] = [];
  let start = 1;
  for (let at = HEADING; at + FIELD <= headingLength && dbf[at] !== FIELDS_END; at += FIELD) {
    const bytes = dbf.subarray(at, at + 11);
    const end = bytes.indexOf(0);
    const name = decode(end < 0 ? bytes : bytes.subarray(0, end)).trim();
    const type = dbf.toString('latin1', at + 11, at + 12).toUpperCase();
    // long texts count on in the place of decimals
    const more = type === 'C' ? 256 * dbf.readUInt8(at + 17) : 0;
    const length = dbf.readUInt8(at + 16) + more;
    fields.push({ name: name === '' ? `column ${fields.length + 1}` : name, type, start, length });
    start += length;
  }
  return fields;
}

function numberIn(text: string): Scalar {
  if (!/^[-+]?(\d+\.?\d*|\.\d+)(e[-+]?\d+)?$/i.test(text)) return null;
  return text.replaceAll(/\D/g, '').replace(/^0+/, '').length > MOST_FIGURES ? text : Number(text);
}

function dateIn(text: string): Scalar {
  const [, year, month, day] = /^(\d{4})(\d\d)(\d\d)$/.exec(text) ?? [];
  return day === undefined || day === '00' ? null : `${year}-${month}-${day}`;
}

function logicalIn(text: string): Scalar {
  if (/^[yt]$/i.test(text)) return true;
  return /^[nf]$/i.test(text) ? false : null;
}

function valueIn(bytes: Buffer, { type }: Field, decode: CodePage['decode']): Scalar {
  if (type === 'I' && bytes.length === 4) return bytes.readInt32LE();
  if ((type === 'B' || type === 'O') && bytes.length === 8) {
    const value = bytes.readDoubleLE();
    return Number.isFinite(value) ? value : null;
  }
  if (!'CNFDL'.includes(type)) return null;
  // figures and blanks of numbers are the same in every page
  const isText = type === 'C';
  const text = (isText ? decode(bytes) : bytes.toString('latin1')).replaceAll('\0', '').trim();
  if (text === '' || isText) return text === '' ? null : text;
  if (type === 'D') return dateIn(text);
  return type === 'L' ? logicalIn(text) : numberIn(text);
}

/** The table beside the shapes: texts, numbers, dates as 2026-12-01, and yes or no. */
export function dbfTable(dbf: Buffer, { decode }: CodePage): DbfTable {
  if (dbf.length < HEADING + 1) throw damaged();
  const [count, headingLength] = [dbf.readUInt32LE(4), dbf.readUInt16LE(8)];
  const rowLength = dbf.readUInt16LE(10);
  if (headingLength + count * rowLength > dbf.length || rowLength < 1) throw damaged();
  const fields = fieldsOf(dbf, headingLength, decode).filter(
    ({ start, length }) => start + length <= rowLength,
  );
  return {
    columns: fields.map(({ name }) => name),
    count,
    row: (index) => {
      const at = headingLength + index * rowLength;
      if (dbf[at] === DELETED) return undefined;
      const row = noProperties();
      for (const field of fields) {
        const bytes = dbf.subarray(at + field.start, at + field.start + field.length);
        row[field.name] = valueIn(bytes, field, decode);
      }
      return row;
    },
  };
}
