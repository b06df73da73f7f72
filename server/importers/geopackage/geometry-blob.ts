import { readWkb } from '../geometry/read-wkb.ts';
import { RowFault } from '../geometry/row-fault.ts';

const HEADING = 8;
/** Bytes of the box that may stand before a geometry, by its kind. */
const BOXES = [0, 32, 48, 48, 64];

/** Reads a geometry as GeoPackages keep it: a heading, a box and well-known binary. */
export function readGeometryBlob(blob: Uint8Array): unknown {
  const bytes = Buffer.from(blob.buffer, blob.byteOffset, blob.byteLength);
  if (bytes.toString('latin1', 0, 2) !== 'GP') return readWkb(bytes);
  const flags = bytes[3] ?? 0;
  const box = BOXES[(flags >> 1) & 7];
  if (box === undefined || (flags & 0x20) !== 0) {
    throw new RowFault('Its geometry is of a kind that is not known here.');
  }
  return readWkb(bytes.subarray(HEADING + box));
}
