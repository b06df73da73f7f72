import { inflateSync } from 'node:zlib';

const [WOFF_HEADER, WOFF_ENTRY] = [44, 20];
const [HEADER, ENTRY] = [12, 16];
const WOFF = 0x774f4646;

type Table = { readonly tag: Buffer; readonly checksum: number; readonly data: Buffer };

function tablesOf(woff: Buffer): readonly Table[] {
  return Array.from({ length: woff.readUInt16BE(12) }, (_, k) => {
    const at = WOFF_HEADER + k * WOFF_ENTRY;
    const [offset, packed, size] = [4, 8, 12].map((skip) => woff.readUInt32BE(at + skip));
    const data = woff.subarray(offset, (offset ?? 0) + (packed ?? 0));
    return {
      tag: woff.subarray(at, at + 4),
      checksum: woff.readUInt32BE(at + 16),
      data: packed === size ? data : inflateSync(data),
    };
  });
}

function padded(size: number): number {
  return Math.ceil(size / 4) * 4;
}

/** A font as it was before it was packed for the web; what reads it would else unpack it for every document. */
export function unpackFont(woff: Buffer): Buffer {
  if (woff.readUInt32BE(0) !== WOFF) throw new Error('This is no packed font.');
  const tables = tablesOf(woff);
  const start = HEADER + tables.length * ENTRY;
  const font = Buffer.alloc(tables.reduce((sum, { data }) => sum + padded(data.length), start));
  const power = Math.floor(Math.log2(tables.length));
  font.writeUInt32BE(woff.readUInt32BE(4), 0);
  font.writeUInt16BE(tables.length, 4);
  font.writeUInt16BE(16 * 2 ** power, 6);
  font.writeUInt16BE(power, 8);
  font.writeUInt16BE(16 * (tables.length - 2 ** power), 10);
  let at = start;
  for (const [k, { tag, checksum, data }] of tables.entries()) {
    const entry = HEADER + k * ENTRY;
    tag.copy(font, entry);
    font.writeUInt32BE(checksum, entry + 4);
    font.writeUInt32BE(at, entry + 8);
    font.writeUInt32BE(data.length, entry + 12);
    data.copy(font, at);
    at += padded(data.length);
  }
  return font;
}
