import { AppError } from '../errors.ts';

/** One file of an archive, as the list at the archive's end describes it. */
export type ZipEntry = {
  readonly name: string;
  readonly method: number;
  readonly crc: number;
  readonly packed: number;
  readonly unpacked: number;
  /** Where its own heading begins. */
  readonly at: number;
};

const END = 0x06054b50;
const END_SIZE = 22;
const LONGEST_COMMENT = 0xffff;
const LISTED = 0x02014b50;
const LISTED_SIZE = 46;
/** A workbook with many sheets and pictures has hundreds. */
const MOST_ENTRIES = 1000;
const ENCRYPTED = 1;

function unreadable(reason: string): AppError {
  return new AppError('unreadable', `The archive cannot be read: ${reason}`);
}

function endOf(bytes: Buffer): number {
  const earliest = Math.max(0, bytes.length - END_SIZE - LONGEST_COMMENT);
  for (let at = bytes.length - END_SIZE; at >= earliest; at -= 1) {
    if (bytes.readUInt32LE(at) === END) return at;
  }
  throw unreadable('its end is missing.');
}

function entryAt(bytes: Buffer, at: number): ZipEntry & { readonly next: number } {
  if (at + LISTED_SIZE > bytes.length || bytes.readUInt32LE(at) !== LISTED) {
    throw unreadable('its list of files is damaged.');
  }
  if ((bytes.readUInt16LE(at + 8) & ENCRYPTED) !== 0) throw unreadable('it is locked.');
  const nameEnd = at + LISTED_SIZE + bytes.readUInt16LE(at + 28);
  return {
    name: bytes.toString('utf8', at + LISTED_SIZE, nameEnd),
    method: bytes.readUInt16LE(at + 10),
    crc: bytes.readUInt32LE(at + 16),
    packed: bytes.readUInt32LE(at + 20),
    unpacked: bytes.readUInt32LE(at + 24),
    at: bytes.readUInt32LE(at + 42),
    next: nameEnd + bytes.readUInt16LE(at + 30) + bytes.readUInt16LE(at + 32),
  };
}

/** The files of an archive by its own list, nothing unpacked yet. */
export function zipEntries(bytes: Buffer): ZipEntry[] {
  const end = endOf(bytes);
  const count = bytes.readUInt16LE(end + 10);
  if (count > MOST_ENTRIES)
    throw unreadable(`it holds more than ${MOST_ENTRIES.toLocaleString('en-GB')} files.`);
  const entries: ZipEntry[] = [];
  let at = bytes.readUInt32LE(end + 16);
  for (let k = 0; k < count; k += 1) {
    const { next, ...entry } = entryAt(bytes, at);
    entries.push(entry);
    at = next;
  }
  return entries;
}
