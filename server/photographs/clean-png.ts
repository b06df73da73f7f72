import { damagedPhotograph } from './refused-photograph.ts';

const SIGNATURE = 8;
/** Of a chunk beside its data: length, kind, check. */
const AROUND = 12;
const MOST_CHUNKS = 100_000;

/** What a picture is drawn by. Words, times and everything that is not known here go. */
const DRAWN_BY: ReadonlySet<string> = new Set([
  ...['IHDR', 'PLTE', 'IDAT', 'IEND', 'tRNS', 'gAMA', 'cHRM', 'sRGB', 'iCCP', 'sBIT'],
  ...['bKGD', 'pHYs', 'cICP'],
]);

/** A PNG with nothing in it but the picture; with consent what tells where it was taken stays. */
export function cleanPng(bytes: Buffer, keepsPlace: boolean): Buffer {
  const kept: Buffer[] = [bytes.subarray(0, SIGNATURE)];
  let at = SIGNATURE;
  for (let chunks = 0; chunks < MOST_CHUNKS; chunks += 1) {
    if (at + AROUND > bytes.length) throw damagedPhotograph();
    const end = at + AROUND + bytes.readUInt32BE(at);
    if (end > bytes.length) throw damagedPhotograph();
    const kind = bytes.toString('latin1', at + 4, at + 8);
    if ((chunks === 0) !== (kind === 'IHDR')) throw damagedPhotograph();
    if (DRAWN_BY.has(kind) || (keepsPlace && kind === 'eXIf')) kept.push(bytes.subarray(at, end));
    if (kind === 'IEND') return Buffer.concat(kept);
    at = end;
  }
  throw damagedPhotograph();
}
