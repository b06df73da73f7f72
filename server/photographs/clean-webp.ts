import { damagedPhotograph } from './refused-photograph.ts';

const HEAD = 12;
const MOST_CHUNKS = 100_000;
/** In the flags of an extended file: whether it tells of EXIF and of XMP. */
const EXIF_FLAG = 0x08;
const XMP_FLAG = 0x04;

/** What a picture is drawn by. */
const DRAWN_BY: ReadonlySet<string> = new Set(['VP8 ', 'VP8L', 'VP8X', 'ALPH', 'ICCP', 'ANIM', 'ANMF']); // prettier-ignore

/** The chunk with its flags saying what is still in the file. */
function withFlags(chunk: Buffer, hasExif: boolean): Buffer {
  const flags = chunk[8];
  if (flags === undefined || chunk.length < 18) throw damagedPhotograph();
  const copy = Buffer.from(chunk);
  copy[8] = flags & ~XMP_FLAG & (hasExif ? 0xff : ~EXIF_FLAG);
  return copy;
}

/** The chunks of a file by their kinds, each with the byte that fills it up. */
function* chunksOf(bytes: Buffer): Generator<{ readonly kind: string; readonly chunk: Buffer }> {
  const whole = HEAD - 4 + bytes.readUInt32LE(4);
  if (whole > bytes.length) throw damagedPhotograph();
  let at = HEAD;
  for (let chunks = 0; at < whole; chunks += 1) {
    if (at + 8 > whole || chunks >= MOST_CHUNKS) throw damagedPhotograph();
    const length = bytes.readUInt32LE(at + 4);
    const end = at + 8 + length + (length % 2);
    if (end > whole) throw damagedPhotograph();
    yield { kind: bytes.toString('latin1', at, at + 4), chunk: bytes.subarray(at, end) };
    at = end;
  }
}

/** A WebP with nothing in it but the picture; with consent what tells where it was taken stays. */
export function cleanWebp(bytes: Buffer, keepsPlace: boolean): Buffer {
  if (bytes.length < HEAD) throw damagedPhotograph();
  const chunks = [...chunksOf(bytes)].filter(
    ({ kind }) => DRAWN_BY.has(kind) || (keepsPlace && kind === 'EXIF'),
  );
  const hasExif = chunks.some(({ kind }) => kind === 'EXIF');
  const hasPicture = chunks.some(({ kind }) => ['VP8 ', 'VP8L', 'ANMF'].includes(kind));
  if (!hasPicture) throw damagedPhotograph();
  const kept = chunks.map(({ kind, chunk }) =>
    kind === 'VP8X' ? withFlags(chunk, hasExif) : chunk,
  );
  const file = Buffer.concat([bytes.subarray(0, HEAD), ...kept]);
  file.writeUInt32LE(file.length - 8, 4);
  return file;
}
