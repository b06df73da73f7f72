import { promisify } from 'node:util';
import { deflateRaw, inflateRaw } from 'node:zlib';
import { z } from 'zod';
import type { Ground } from './ground.ts';

const pack = promisify<Buffer, { level: number }, Buffer>(deflateRaw);
const unpack = promisify<Buffer, Buffer>(inflateRaw);

const LENGTH = 4;

const headingSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('level'), level: z.number() }),
  z.object({ kind: z.literal('spots') }),
  z.object({
    kind: z.literal('grid'),
    columns: z.number(),
    rows: z.number(),
    west: z.number(),
    south: z.number(),
    width: z.number(),
    height: z.number(),
    crs: z.number().nullable(),
  }),
]);

function split(ground: Ground): { heading: object; numbers: Float64Array | Float32Array } {
  if (ground.kind === 'level') return { heading: ground, numbers: new Float64Array(0) };
  if (ground.kind === 'spots') return { heading: { kind: 'spots' }, numbers: ground.points };
  const { levels, ...heading } = ground;
  return { heading, numbers: levels };
}

/** A ground as it is kept: a heading in words, then its numbers. */
export async function packGround(ground: Ground): Promise<Buffer> {
  const { heading, numbers } = split(ground);
  const words = Buffer.from(JSON.stringify(heading));
  const length = Buffer.alloc(LENGTH);
  length.writeUInt32LE(words.byteLength);
  const { buffer, byteOffset, byteLength } = numbers;
  const body = Buffer.from(buffer, byteOffset, byteLength);
  return Buffer.concat([length, words, await pack(body, { level: 1 })]);
}

/** A ground read back. */
export async function unpackGround(content: Buffer): Promise<Ground> {
  const end = LENGTH + content.readUInt32LE(0);
  const heading = headingSchema.parse(JSON.parse(content.toString('utf8', LENGTH, end)));
  if (heading.kind === 'level') return heading;
  const body = await unpack(content.subarray(end));
  const { buffer } = new Uint8Array(body);
  if (heading.kind === 'spots') return { kind: 'spots', points: new Float64Array(buffer) };
  return { ...heading, levels: new Float32Array(buffer) };
}
