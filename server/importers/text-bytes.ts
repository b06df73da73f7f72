import { isUtf8 } from 'node:buffer';
import { AppError } from '../errors.ts';

const CHUNK = 1024 * 1024;

/** The encoding that the first bytes of a text give away. */
function markedEncoding(bytes: Buffer): 'utf-16le' | 'utf-16be' | undefined {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return 'utf-16le';
  return bytes[0] === 0xfe && bytes[1] === 0xff ? 'utf-16be' : undefined;
}

/** The first letters, which name columns or open brackets, are Latin for the most part. */
const SAMPLE = 512;

/** UTF-16 without its mark has a zero beside most letters, always on the same side. */
function unmarkedEncoding(bytes: Buffer): 'utf-16le' | 'utf-16be' | undefined {
  if (bytes.length < 4 || bytes.length % 2 !== 0) return undefined;
  const zeros = [0, 0];
  const sample = bytes.subarray(0, SAMPLE);
  for (const [at, byte] of sample.entries())
    if (byte === 0) zeros[at % 2] = (zeros[at % 2] ?? 0) + 1;
  const [first = 0, second = 0] = zeros;
  const most = sample.length / 4;
  if (second > most && first === 0) return 'utf-16le';
  return first > most && second === 0 ? 'utf-16be' : undefined;
}

function recoded(bytes: Buffer, encoding: string): Buffer {
  const decoder = new TextDecoder(encoding);
  const parts: Buffer[] = [];
  for (let at = 0; at < bytes.length; at += CHUNK) {
    const piece = bytes.subarray(at, at + CHUNK);
    parts.push(Buffer.from(decoder.decode(piece, { stream: true })));
  }
  parts.push(Buffer.from(decoder.decode()));
  return Buffer.concat(parts);
}

function isBinary(bytes: Buffer): boolean {
  return bytes.subarray(0, CHUNK).includes(0);
}

/**
 * A text in UTF-8 without its mark. UTF-16 is told by its mark or by its zeros; what is neither is
 * `otherwise`, or refused.
 */
export function utf8Bytes(bytes: Buffer, otherwise?: 'windows-1252'): Buffer {
  const marked = markedEncoding(bytes) ?? unmarkedEncoding(bytes);
  if (marked !== undefined) return recoded(bytes, marked);
  const isMarked = bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf;
  const text = isMarked ? bytes.subarray(3) : bytes;
  if (isUtf8(text) && !isBinary(text)) return text;
  if (otherwise !== undefined && !isBinary(text)) return recoded(text, otherwise);
  throw new AppError('unreadable', 'The file is not a text in UTF-8. Save it as UTF-8.');
}
