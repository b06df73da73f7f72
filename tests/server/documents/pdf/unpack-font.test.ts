import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { expect, test } from 'vitest';
import { unpackFont } from '../../../../server/documents/pdf/unpack-font.ts';

const FILE = '@fontsource/noto-sans/files/noto-sans-greek-400-normal.woff';
const WOFF = readFileSync(createRequire(import.meta.url).resolve(FILE));

/** The sum of a table's numbers, as its directory keeps it. */
function checksum(table: Buffer): number {
  let sum = 0;
  for (let at = 0; at < table.length; at += 4) sum = (sum + table.readUInt32BE(at)) >>> 0;
  return sum;
}

test('a font is unpacked table by table, each with its own checksum', () => {
  const font = unpackFont(WOFF);
  const count = font.readUInt16BE(4);
  expect(font.readUInt32BE(0)).toBe(0x00010000);
  expect(count).toBe(WOFF.readUInt16BE(12));
  const tags = Array.from({ length: count }, (_, k) => {
    const entry = 12 + 16 * k;
    const tag = font.toString('latin1', entry, entry + 4);
    const [sum, offset, size] = [4, 8, 12].map((skip) => font.readUInt32BE(entry + skip));
    const padded = Math.ceil((size ?? 0) / 4) * 4;
    // that of the head is reckoned without a number of its own
    if (tag !== 'head') expect(checksum(font.subarray(offset, (offset ?? 0) + padded))).toBe(sum);
    return tag;
  });
  expect(tags).toContain('cmap');
  expect(tags).toContain('glyf');
});

test('what is no packed font is refused', () => {
  expect(() => unpackFont(Buffer.alloc(64))).toThrow('no packed font');
});
