type Point = readonly [number, number];

const [LINE, AREA, POINT] = [3, 5, 1];

export type Shape = { readonly parts: readonly (readonly Point[])[] };

function content(type: number, { parts }: Shape): Buffer {
  const points = parts.flat();
  if (type === POINT) {
    const bytes = Buffer.alloc(20);
    bytes.writeInt32LE(POINT);
    points.slice(0, 1).flat().forEach((value, k) => bytes.writeDoubleLE(value, 4 + 8 * k)); // prettier-ignore
    return bytes;
  }
  const bytes = Buffer.alloc(44 + 4 * parts.length + 16 * points.length);
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
export function shpFile(kind: 'lines' | 'areas' | 'points', shapes: readonly Shape[]): Buffer {
  const type = { lines: LINE, areas: AREA, points: POINT }[kind];
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

/** A table of names beside the shapes, written in an encoding. */
export function dbfFile(names: readonly string[], encoding: BufferEncoding = 'utf8'): Buffer {
  const width = 40;
  const head = Buffer.alloc(65);
  head.writeUInt8(3);
  head.writeUInt32LE(names.length, 4);
  head.writeUInt16LE(head.length, 8);
  head.writeUInt16LE(1 + width, 10);
  head.write('NAME', 32);
  head.write('C', 43);
  head.writeUInt8(width, 48);
  head.writeUInt8(0x0d, 64);
  const rows = names.map((name) => {
    const row = Buffer.alloc(1 + width, ' ');
    row.write(name, 1, encoding);
    return row;
  });
  return Buffer.concat([head, ...rows]);
}

/** UTM zone 31 as programs for maps write it beside shapes. */
export const UTM_31_PRJ =
  'PROJCS["WGS_1984_UTM_Zone_31N",GEOGCS["GCS_WGS_1984",DATUM["D_WGS_1984",SPHEROID["WGS_1984",6378137.0,298.257223563]],PRIMEM["Greenwich",0.0],UNIT["Degree",0.0174532925199433]],PROJECTION["Transverse_Mercator"],PARAMETER["False_Easting",500000.0],PARAMETER["False_Northing",0.0],PARAMETER["Central_Meridian",3.0],PARAMETER["Scale_Factor",0.9996],PARAMETER["Latitude_Of_Origin",0.0],UNIT["Meter",1.0]]';
