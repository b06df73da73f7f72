import { isUtf8 } from 'node:buffer';
import iconv from 'iconv-lite';

/** The languages that a table may name in its heading by a number. */
const BY_LANGUAGE: Readonly<Record<number, string>> = {
  0x01: 'cp437', 0x02: 'cp850', 0x03: 'cp1252', 0x08: 'cp865', 0x09: 'cp437', 0x0a: 'cp850',
  0x0b: 'cp437', 0x0d: 'cp437', 0x0e: 'cp850', 0x0f: 'cp437', 0x10: 'cp850', 0x11: 'cp437',
  0x12: 'cp850', 0x13: 'cp932', 0x14: 'cp850', 0x15: 'cp437', 0x16: 'cp850', 0x17: 'cp865',
  0x18: 'cp437', 0x19: 'cp437', 0x1a: 'cp850', 0x1b: 'cp437', 0x1c: 'cp863', 0x1d: 'cp850',
  0x1f: 'cp852', 0x22: 'cp852', 0x23: 'cp852', 0x24: 'cp860', 0x25: 'cp850', 0x26: 'cp866',
  0x37: 'cp850', 0x40: 'cp852', 0x4d: 'cp936', 0x4e: 'cp949', 0x4f: 'cp950', 0x50: 'cp874',
  0x57: 'cp1252', 0x58: 'cp1252', 0x59: 'cp1252', 0x64: 'cp852', 0x65: 'cp866', 0x66: 'cp865',
  0x67: 'cp861', 0x6a: 'cp737', 0x6b: 'cp857', 0x6c: 'cp863', 0x78: 'cp950', 0x79: 'cp949',
  0x7a: 'cp936', 0x7b: 'cp932', 0x7c: 'cp874', 0x86: 'cp737', 0x87: 'cp852', 0x88: 'cp857',
  0xc8: 'cp1250', 0xc9: 'cp1251', 0xca: 'cp1254', 0xcb: 'cp1253', 0xcc: 'cp1257',
}; // prettier-ignore

const LANGUAGE_AT = 29;
const FALLBACK = 'cp1252';

/** What iconv calls an encoding that a .cpg file names in one of its many ways. */
function pageOf(words: string): string | undefined {
  const name = words.trim().toLowerCase();
  if (name === '') return undefined;
  if (/utf-?8|65001/.test(name)) return 'utf8';
  const latin = /^(?:iso)?[ _-]?8859[ _-]?(\d{1,2})$/.exec(name)?.[1];
  const digits = /^(?:ansi|oem|cp|windows|ms)?[ _-]?(\d{3,5})$/.exec(name)?.[1];
  const called = [latin && `iso-8859-${latin}`, digits && `cp${digits}`, name];
  return called.find((one) => one !== undefined && iconv.encodingExists(one));
}

/** A text in UTF-8 without a last letter that its column was too narrow for. */
function wholeLetters(bytes: Buffer): Buffer {
  const start = bytes.findLastIndex((byte) => byte < 0x80 || byte >= 0xc0);
  const first = bytes[start] ?? 0;
  const length = first < 0xc0 ? 1 : first < 0xe0 ? 2 : first < 0xf0 ? 3 : 4;
  return start > 0 && bytes.length - start < length ? bytes.subarray(0, start) : bytes;
}

export type CodePage = {
  readonly decode: (bytes: Buffer) => string;
  /** That the page which the file names is not known, as a sentence. */
  readonly note: string | undefined;
};

/**
 * How the letters of a table are written: as the .cpg file beside it says, or its own heading, else
 * Western. Many tables are in UTF-8 whatever they say, which hardly any other text looks like.
 */
export function codePage(dbf: Buffer, cpg: string | undefined): CodePage {
  const named = pageOf(cpg ?? '');
  const page = named ?? BY_LANGUAGE[dbf[LANGUAGE_AT] ?? 0] ?? FALLBACK;
  const isStrange = named === undefined && (cpg ?? '').trim() !== '';
  return {
    decode: (bytes) => {
      const text = page === 'utf8' ? wholeLetters(bytes) : bytes;
      if (isUtf8(text)) return iconv.decode(text, 'utf8');
      // many say UTF-8 and are not
      return iconv.decode(bytes, page === 'utf8' ? FALLBACK : page);
    },
    note: isStrange
      ? 'The .cpg file names letters that are not known here: look at names with accents.'
      : undefined,
  };
}
