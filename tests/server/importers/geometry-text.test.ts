import { describe, expect, test } from 'vitest';
import { geometryBlob } from '../../support/footprint-files.ts';
import { rowsOf, uploadOf } from '../../support/upload-of.ts';

const RING = [[3, 54], [3.1, 54], [3.1, 54.1], [3, 54]] as const; // prettier-ignore

/** Of a kind by its number, each holding the next; the last is a line or arc of the ring. */
function binary(...kinds: readonly number[]): Buffer {
  const [kind = 0, ...inner] = kinds;
  const head = Buffer.alloc(9);
  head.writeUInt8(1);
  head.writeUInt32LE(kind, 1);
  head.writeUInt32LE(inner.length > 0 ? 1 : RING.length, 5);
  const points = Buffer.alloc(16 * RING.length);
  RING.flat().forEach((value, index) => points.writeDoubleLE(value, 8 * index));
  return Buffer.concat([head, inner.length > 0 ? binary(...inner) : points]);
}

function table(...shapes: readonly string[]): Buffer {
  const lines = shapes.map((shape, index) => `${index + 1};"${shape}"`);
  return Buffer.from(['reference;geom', ...lines].join('\n'));
}

const [LINE, ARC, COMPOUND, CURVE_POLYGON, MULTI_SURFACE] = [2, 8, 9, 10, 12];

describe('a table with geometries in binary', () => {
  test.each([true, false])(
    'is read from hexadecimal letters (little endian: %s)',
    async (isLittle) => {
      const parts = [[RING], [RING]];
      // without the heading and box that stand before it in a GeoPackage
      const blob = geometryBlob(parts, 7, isLittle);
      const hex = blob.subarray(40).toString('hex');
      const [row] = await rowsOf(table(hex, hex));
      expect(row?.geometry).toEqual(parts);
      expect(row?.properties).toEqual({ reference: '1' });
    },
  );

  test('knows the system that they name', async () => {
    const plain = binary(CURVE_POLYGON, LINE);
    const marked = Buffer.concat([plain.subarray(0, 5), Buffer.from([0x66, 0x7d, 0, 0]), plain.subarray(5)]); // prettier-ignore
    marked.writeUInt32LE(CURVE_POLYGON + 0x20000000, 1);
    const upload = await uploadOf(table(`\\x${marked.toString('hex').toUpperCase()}`));
    expect(upload).toMatchObject({ kind: 'footprints', crs: { code: 32102 } });
  });

  test('is not made up of long numbers', async () => {
    const numbers = table('010000000000012345', '0106100000054321', '00112233445566778899');
    expect(await uploadOf(numbers)).toMatchObject({ kind: 'values' });
  });
});

describe('what may hold curves', () => {
  test.each([
    ['binary', binary(CURVE_POLYGON, LINE).toString('hex')],
    ['binary of several', binary(MULTI_SURFACE, CURVE_POLYGON, COMPOUND, LINE).toString('hex')],
    ['text', 'CURVEPOLYGON((3 54,3.1 54,3.1 54.1,3 54))'],
    ['text of several', 'MULTISURFACE Z (((3 54 7,3.1 54 7,3.1 54.1 7,3 54 7)))'],
  ])('is taken in %s where it holds none', async (_, shape) => {
    expect((await rowsOf(table(shape)))[0]).toMatchObject({ geometry: [[RING]], fault: null });
  });

  test.each([
    ['binary', binary(MULTI_SURFACE, CURVE_POLYGON, ARC).toString('hex')],
    ['text', 'MULTISURFACE(CURVEPOLYGON(CIRCULARSTRING(3 54,3.1 54,3 54)))'],
    ['text of one', 'CURVEPOLYGON(CIRCULARSTRING(3 54,3.1 54,3 54))'],
  ])('is refused in %s where it holds one', async (_, shape) => {
    const good = 'POLYGON((3 54,3.1 54,3.1 54.1,3 54))';
    expect((await rowsOf(table(good, shape)))[1]?.fault).toMatch(/has curves/);
  });
});
