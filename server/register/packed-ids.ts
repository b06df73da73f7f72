const BYTES = 4;

/** Whole numbers of four bytes each, as the database packs them. */
export function unpackIds(bytes: Buffer): Int32Array {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  return Int32Array.from({ length: bytes.byteLength / BYTES }, (_, k) => view.getInt32(k * BYTES));
}

/** The same the other way. */
export function packIds(ids: Int32Array): Buffer {
  const view = new DataView(new ArrayBuffer(ids.length * BYTES));
  ids.forEach((id, k) => {
    view.setInt32(k * BYTES, id);
  });
  return Buffer.from(view.buffer);
}
