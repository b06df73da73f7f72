import { promisify } from 'node:util';
import { Readable } from 'node:stream';
import { crc32, createInflateRaw, inflateRaw } from 'node:zlib';
import { AppError } from '../errors.ts';
import type { ZipEntry } from './zip-entries.ts';

const inflate = promisify<Buffer, { maxOutputLength: number }, Buffer>(inflateRaw);

const OWN_HEADING = 0x04034b50;
const OWN_HEADING_SIZE = 30;
const STORED = 0;
const DEFLATED = 8;
const CHUNK = 256 * 1024;

function damaged({ name }: ZipEntry): AppError {
  return new AppError('unreadable', `The archive cannot be read: "${name}" is damaged.`);
}

function packedBytes(bytes: Buffer, entry: ZipEntry): Buffer {
  const { at, packed } = entry;
  if (at + OWN_HEADING_SIZE > bytes.length || bytes.readUInt32LE(at) !== OWN_HEADING) {
    throw damaged(entry);
  }
  const start = at + OWN_HEADING_SIZE + bytes.readUInt16LE(at + 26) + bytes.readUInt16LE(at + 28);
  if (start + packed > bytes.length) throw damaged(entry);
  if (entry.method !== STORED && entry.method !== DEFLATED) {
    throw new AppError('unreadable', `"${entry.name}" is packed in a way that is not known here.`);
  }
  return bytes.subarray(start, start + packed);
}

/** A file of an archive, unpacked to the length that the list gives and to no more. */
export async function unpackEntry(bytes: Buffer, entry: ZipEntry): Promise<Buffer> {
  const packed = packedBytes(bytes, entry);
  try {
    const file =
      entry.method === STORED
        ? packed
        : await inflate(packed, { maxOutputLength: Math.max(1, entry.unpacked) });
    if (file.length === entry.unpacked && crc32(file) === entry.crc) return file;
  } catch (error) {
    throw error instanceof AppError ? error : damaged(entry);
  }
  throw damaged(entry);
}

function* chunksOf(bytes: Buffer): Generator<Buffer> {
  for (let at = 0; at < bytes.length; at += CHUNK) yield bytes.subarray(at, at + CHUNK);
}

/** The same piece by piece, for what is too large to be held whole. */
export async function* unpackChunks(bytes: Buffer, entry: ZipEntry): AsyncGenerator<Buffer> {
  const packed = Readable.from(chunksOf(packedBytes(bytes, entry)));
  const file = entry.method === STORED ? packed : packed.pipe(createInflateRaw());
  let [length, crc] = [0, 0];
  try {
    for await (const chunk of file as AsyncIterable<Buffer>) {
      [length, crc] = [length + chunk.length, crc32(chunk, crc)];
      if (length > entry.unpacked) throw damaged(entry);
      yield chunk;
    }
  } catch (error) {
    throw error instanceof AppError ? error : damaged(entry);
  } finally {
    packed.destroy();
    file.destroy();
  }
  if (length !== entry.unpacked || crc !== entry.crc) throw damaged(entry);
}
