import { AppError } from '../errors.ts';
import { BACKGROUND_LIMITS } from '../../shared/schemas/background.ts';

type Field = { readonly start: number; readonly length: number };

const HEADING = 32;
const FIELD = 32;
const FIELDS_END = 0x0d;
const TEXT = 'C';

function damaged(): AppError {
  return new AppError('unreadable', 'The table beside the shapes is damaged.');
}

/** The column called "name", in whatever letters; columns stand one after another behind a mark. */
function nameField(dbf: Buffer, headingLength: number): Field | undefined {
  let start = 1;
  for (let at = HEADING; at + FIELD <= headingLength && dbf[at] !== FIELDS_END; at += FIELD) {
    const name = dbf.toString('latin1', at, at + 11).replace(/\0.*$/s, '');
    const length = dbf.readUInt8(at + 16);
    const isText = dbf.toString('latin1', at + 11, at + 12) === TEXT;
    if (isText && name.trim().toLowerCase() === 'name') return { start, length };
    start += length;
  }
  return undefined;
}

/** Tables say in a file beside them how their letters are written; many do not, and are UTF-8 or Western. */
function decoder(cpg: string | undefined): (bytes: Buffer) => string {
  const page = /(\d{4})\s*$/.exec(cpg ?? '')?.[1] ?? '1252';
  const known = /^125\d$|^874$/.test(page) ? page : '1252';
  const [utf8, other] = [
    new TextDecoder('utf-8', { fatal: true }),
    new TextDecoder(`windows-${known}`),
  ];
  return (bytes) => {
    try {
      return utf8.decode(bytes);
    } catch {
      return other.decode(bytes);
    }
  };
}

/** What stands in the column "name" of a table, row by row; nothing where there is no such column. */
export function tableNames(dbf: Buffer, cpg?: string): string[] {
  if (dbf.length < HEADING) throw damaged();
  const [rows, headingLength] = [dbf.readUInt32LE(4), dbf.readUInt16LE(8)];
  const rowLength = dbf.readUInt16LE(10);
  const isWhole = headingLength + rows * rowLength <= dbf.length && headingLength <= dbf.length;
  if (!isWhole || rows > BACKGROUND_LIMITS.features) throw damaged();
  const field = nameField(dbf, headingLength);
  if (field === undefined || field.start + field.length > rowLength) return [];
  const decode = decoder(cpg);
  return Array.from({ length: rows }, (_, row) => {
    const at = headingLength + row * rowLength + field.start;
    return decode(dbf.subarray(at, at + field.length));
  });
}
