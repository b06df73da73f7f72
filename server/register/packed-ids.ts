const BYTES = 4;

/** Whole numbers of four bytes each, as the database packs them. */
export function unpackIds(bytes: Buffer): Int32Array {
  const ids = new Int32Array(bytes.byteLength / BYTES);
  for (let k = 0; k < ids.length; k += 1) ids[k] = bytes.readInt32BE(k * BYTES);
  return ids;
}

/** The same the other way. */
export function packIds(ids: Int32Array): Buffer {
  const view = new DataView(new ArrayBuffer(ids.length * BYTES));
  ids.forEach((id, k) => {
    view.setInt32(k * BYTES, id);
  });
  return Buffer.from(view.buffer);
}

const FIGURE_BYTES = 8;

/** Figures of eight bytes each, as the database packs them. */
export function unpackFigures(bytes: Buffer): Float64Array {
  const figures = new Float64Array(bytes.byteLength / FIGURE_BYTES);
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  for (let k = 0; k < figures.length; k += 1) figures[k] = view.getFloat64(k * FIGURE_BYTES);
  return figures;
}

/** Numbers of buildings, packed. */
export type PackedIds = {
  readonly count: number;
  readonly slice: (from: number, to: number) => number[];
  readonly indexOf: (id: number) => number | null;
};

/** What the database packed, read where it is asked for. */
export function packedIds(bytes: Buffer): PackedIds {
  const count = bytes.byteLength / BYTES;
  return {
    count,
    slice: (from, to) => {
      const length = Math.max(0, Math.min(to, count) - from);
      return Array.from({ length }, (_, k) => bytes.readInt32BE((from + k) * BYTES));
    },
    indexOf: (id) => {
      for (let k = 0; k < count; k += 1) if (bytes.readInt32BE(k * BYTES) === id) return k;
      return null;
    },
  };
}

const AT_ONCE = 1000;

/** An order in lists of a thousand. */
export function* inThousands({ count, slice }: PackedIds): Generator<number[]> {
  for (let from = 0; from < count; from += AT_ONCE) yield slice(from, from + AT_ONCE);
}
