import { crc32, deflateSync } from 'node:zlib';

/** Words that stand where a camera writes what tells of the place. */
export const SECRET_PLACE = 'N 54 45 W 001 38';

function jpegSegment(code: number, data: Buffer): Buffer {
  const head = Buffer.from([0xff, code, 0, 0]);
  head.writeUInt16BE(data.length + 2, 2);
  return Buffer.concat([head, data]);
}

const SCAN = Buffer.concat([
  jpegSegment(0xdb, Buffer.alloc(65, 1)),
  jpegSegment(0xc0, Buffer.from([8, 0, 2, 0, 3, 1, 1, 0x11, 0])),
  jpegSegment(0xda, Buffer.from([1, 1, 0, 0, 63, 0])),
  // what looks like a marker inside of a scan, and a mark to begin anew
  Buffer.from([0x12, 0xff, 0x00, 0x34, 0xff, 0xd0, 0x56]),
]);

/** A picture of 3 by 2 pixels as a camera writes it, with where it was taken. */
export function aJpeg({ words = 'seen', after = '' } = {}): Buffer {
  return Buffer.concat([
    Buffer.from([0xff, 0xd8]),
    jpegSegment(0xe0, Buffer.from('JFIF\0\x01\x01\0\0\x01\0\x01\0\0', 'latin1')),
    jpegSegment(0xe1, Buffer.from(`Exif\0\0MM${SECRET_PLACE}`, 'latin1')),
    jpegSegment(0xe1, Buffer.from(`http:xap\0${SECRET_PLACE}`, 'latin1')),
    jpegSegment(0xe2, Buffer.from('ICC_PROFILE\0colours', 'latin1')),
    jpegSegment(0xe2, Buffer.from(`MPF\0${SECRET_PLACE}`, 'latin1')),
    jpegSegment(0xed, Buffer.from(`Photo\0${SECRET_PLACE}`, 'latin1')),
    jpegSegment(0xfe, Buffer.from(words, 'latin1')),
    SCAN,
    Buffer.from([0xff, 0xd9]),
    Buffer.from(after, 'latin1'),
  ]);
}

function pngChunk(kind: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(kind, 'latin1'), data]);
  const [length, check] = [Buffer.alloc(4), Buffer.alloc(4)];
  length.writeUInt32BE(data.length);
  check.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, check]);
}

/** A picture in one colour that any browser draws, with where it was taken. */
export function aPng({ width = 3, height = 2, after = '' } = {}): Buffer {
  const head = Buffer.alloc(13);
  head.writeUInt32BE(width, 0);
  head.writeUInt32BE(height, 4);
  head.set([8, 2, 0, 0, 0], 8);
  const row = Buffer.concat([Buffer.from([0]), Buffer.alloc(3 * width, 0xa0)]);
  const rows = Buffer.concat(Array.from({ length: height }, () => row));
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    pngChunk('IHDR', head),
    pngChunk('tEXt', Buffer.from(`Comment\0${SECRET_PLACE}`, 'latin1')),
    pngChunk('IDAT', deflateSync(rows)),
    pngChunk('eXIf', Buffer.from(SECRET_PLACE, 'latin1')),
    pngChunk('IEND', Buffer.alloc(0)),
    Buffer.from(after, 'latin1'),
  ]);
}

function webpChunk(kind: string, data: Buffer): Buffer {
  const head = Buffer.alloc(8);
  head.write(kind, 'latin1');
  head.writeUInt32LE(data.length, 4);
  return Buffer.concat([head, data, Buffer.alloc(data.length % 2)]);
}

/** The parts of a picture of the extended kind, with where it was taken. */
export function aWebp({ after = '' } = {}): Buffer {
  const chunks = Buffer.concat([
    webpChunk('VP8X', Buffer.from([0x2c, 0, 0, 0, 2, 0, 0, 1, 0, 0])),
    webpChunk('ICCP', Buffer.from('colours', 'latin1')),
    webpChunk('VP8L', Buffer.from('lossless', 'latin1')),
    webpChunk('EXIF', Buffer.from(SECRET_PLACE, 'latin1')),
    webpChunk('XMP ', Buffer.from(`<x>${SECRET_PLACE}</x>`, 'latin1')),
    webpChunk('odd?', Buffer.from(SECRET_PLACE, 'latin1')),
  ]);
  const head = Buffer.alloc(12);
  head.write('RIFF', 0, 'latin1');
  head.writeUInt32LE(chunks.length + 4, 4);
  head.write('WEBP', 8, 'latin1');
  return Buffer.concat([head, chunks, Buffer.from(after, 'latin1')]);
}
