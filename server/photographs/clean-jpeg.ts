import { damagedPhotograph } from './refused-photograph.ts';

const MARKER = 0xff;
const START_OF_IMAGE = 0xd8;
const END_OF_IMAGE = 0xd9;
const START_OF_SCAN = 0xda;
const COMMENT = 0xfe;
/** No photograph has as many. */
const MOST_SEGMENTS = 10_000;

/** Marks what a segment for applications holds by the letters that it begins with. */
function begins(segment: Buffer, letters: string): boolean {
  return segment.subarray(4, 4 + letters.length).toString('latin1') === letters;
}

/** What a picture is drawn by, and with consent what tells where it was taken; words and the rest go. */
function isKept(code: number, segment: Buffer, keepsPlace: boolean): boolean {
  if (code === COMMENT) return false;
  if (code < 0xe0 || code > 0xef) return true;
  if (code === 0xe0) return begins(segment, 'JFIF\0');
  if (code === 0xe1) return keepsPlace && begins(segment, 'Exif\0\0');
  if (code === 0xe2) return begins(segment, 'ICC_PROFILE\0');
  return code === 0xee && begins(segment, 'Adobe');
}

function hasNoLength(code: number): boolean {
  return code === 0x01 || (code >= 0xd0 && code <= 0xd7);
}

/** Where the picture's own data end after the head of a scan: at the next marker that means something. */
function endOfScan(bytes: Buffer, from: number): number {
  let at = bytes.indexOf(MARKER, from);
  while (at >= 0 && at + 1 < bytes.length) {
    const code = bytes[at + 1] ?? 0;
    if (code !== 0x00 && code !== MARKER && !hasNoLength(code)) return at;
    at = bytes.indexOf(MARKER, at + (code === MARKER ? 1 : 2));
  }
  throw damagedPhotograph();
}

/** The end of the segment that begins at a marker. */
function endOfSegment(bytes: Buffer, at: number): number {
  if (at + 4 > bytes.length) throw damagedPhotograph();
  const length = bytes.readUInt16BE(at + 2);
  const end = at + 2 + length;
  if (length < 2 || end > bytes.length) throw damagedPhotograph();
  return end;
}

/**
 * A JPEG with nothing in it but the picture: no words, no places, nothing after its end. With consent the
 * segments that tell where it was taken stay.
 */
export function cleanJpeg(bytes: Buffer, keepsPlace: boolean): Buffer {
  const kept: Buffer[] = [bytes.subarray(0, 2)];
  let at = 2;
  for (let segments = 0; segments < MOST_SEGMENTS; segments += 1) {
    if (bytes[at] !== MARKER) throw damagedPhotograph();
    const code = bytes[at + 1] ?? 0;
    if (code === MARKER) {
      at += 1;
    } else if (code === END_OF_IMAGE) {
      kept.push(bytes.subarray(at, at + 2));
      return Buffer.concat(kept);
    } else if (code === 0x00 || code === START_OF_IMAGE) {
      throw damagedPhotograph();
    } else if (hasNoLength(code)) {
      at += 2;
    } else {
      const end = endOfSegment(bytes, at);
      const next = code === START_OF_SCAN ? endOfScan(bytes, end) : end;
      const segment = bytes.subarray(at, next);
      if (isKept(code, segment, keepsPlace)) kept.push(segment);
      at = next;
    }
  }
  throw damagedPhotograph();
}
