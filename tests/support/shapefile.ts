type Point = readonly [number, number];

const [LINE, AREA, POINT, AREA_Z] = [3, 5, 1, 15];

export type Shape = { readonly parts: readonly (readonly Point[])[] };

function content(type: number, { parts }: Shape): Buffer {
  const points = parts.flat();
  if (type === POINT) {
    const bytes = Buffer.alloc(20);
    bytes.writeInt32LE(POINT);
    points.slice(0, 1).flat().forEach((value, k) => bytes.writeDoubleLE(value, 4 + 8 * k)); // prettier-ignore
    return bytes;
  }
  // heights and measures stand behind the points, each with its range
  const more = type === AREA_Z ? 2 * (16 + 8 * points.length) : 0;
  const bytes = Buffer.alloc(44 + 4 * parts.length + 16 * points.length + more);
  bytes.writeInt32LE(type);
  bytes.writeInt32LE(parts.length, 36);
  bytes.writeInt32LE(points.length, 40);
  let first = 0;
  for (const [k, part] of parts.entries()) {
    bytes.writeInt32LE(first, 44 + 4 * k);
    first += part.length;
  }
  points.flat().forEach((value, k) => {
    bytes.writeDoubleLE(value, 44 + 4 * parts.length + 8 * k);
  });
  return bytes;
}

/** A file of shapes of one kind. */
export function shpFile(
  kind: 'lines' | 'areas' | 'points' | 'areas with heights',
  shapes: readonly Shape[],
): Buffer {
  const type = { lines: LINE, areas: AREA, points: POINT, 'areas with heights': AREA_Z }[kind];
  const head = Buffer.alloc(100);
  head.writeInt32BE(9994);
  head.writeInt32LE(1000, 28);
  head.writeInt32LE(type, 32);
  const records = shapes.flatMap((shape, k) => {
    const record = content(type, shape);
    const heading = Buffer.alloc(8);
    heading.writeInt32BE(k + 1);
    heading.writeInt32BE(record.length / 2, 4);
    return [heading, record];
  });
  const file = Buffer.concat([head, ...records]);
  file.writeInt32BE(file.length / 2, 24);
  return file;
}

export type Column = { readonly name: string; readonly type: string; readonly length: number };

/** A table beside the shapes, written in an encoding; "*" in front of a row marks it as deleted. */
export function tableFile(
  columns: readonly Column[],
  rows: readonly (readonly (string | Buffer)[])[],
  options: {
    readonly encoding?: BufferEncoding;
    readonly language?: number;
    readonly deleted?: readonly number[];
  } = {},
): Buffer {
  const { encoding = 'utf8', language = 0, deleted = [] } = options;
  const width = columns.reduce((sum, { length }) => sum + length, 1);
  const head = Buffer.alloc(33 + 32 * columns.length);
  head.writeUInt8(3);
  head.writeUInt32LE(rows.length, 4);
  head.writeUInt16LE(head.length, 8);
  head.writeUInt16LE(width, 10);
  head.writeUInt8(language, 29);
  for (const [k, { name, type, length }] of columns.entries()) {
    head.write(name, 32 + 32 * k);
    head.write(type, 43 + 32 * k);
    head.writeUInt8(length, 48 + 32 * k);
  }
  head.writeUInt8(0x0d, head.length - 1);
  const records = rows.map((values, index) => {
    const row = Buffer.alloc(width, ' ');
    if (deleted.includes(index)) row.write('*');
    let at = 1;
    for (const [k, { length }] of columns.entries()) {
      const value = values[k] ?? '';
      const bytes = typeof value === 'string' ? Buffer.from(value, encoding) : value;
      bytes.copy(row, at, 0, length);
      at += length;
    }
    return row;
  });
  return Buffer.concat([head, ...records]);
}

/** A table of names beside the shapes. */
export function dbfFile(names: readonly string[], encoding: BufferEncoding = 'utf8'): Buffer {
  const column = { name: 'NAME', type: 'C', length: 40 };
  return tableFile(
    [column],
    names.map((name) => [name]),
    { encoding },
  );
}

/** UTM zone 31 as programs for maps write it beside shapes. */
export const UTM_31_PRJ =
  'PROJCS["WGS_1984_UTM_Zone_31N",GEOGCS["GCS_WGS_1984",DATUM["D_WGS_1984",SPHEROID["WGS_1984",6378137.0,298.257223563]],PRIMEM["Greenwich",0.0],UNIT["Degree",0.0174532925199433]],PROJECTION["Transverse_Mercator"],PARAMETER["False_Easting",500000.0],PARAMETER["False_Northing",0.0],PARAMETER["Central_Meridian",3.0],PARAMETER["Scale_Factor",0.9996],PARAMETER["Latitude_Of_Origin",0.0],UNIT["Meter",1.0]]';
