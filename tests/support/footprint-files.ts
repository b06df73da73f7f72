import ExcelJS from 'exceljs';
import initSqlJs from 'sql.js';
import type { Parts, TwinRow } from './twin-town.ts';
import { shpFile, tableFile } from './shapefile.ts';
import { zipFile } from './zip-file.ts';

type Rows = readonly TwinRow[];

function columnsOf(rows: Rows): readonly string[] {
  return Object.keys(rows[0]?.attributes ?? {});
}

/** GeoJSON with heights; `crs` as older programs write it. */
export function geojsonFile(rows: Rows, crs?: string): Buffer {
  const features = rows.map(({ parts, height, attributes }) => {
    const coordinates = parts.map((part) =>
      part.map((ring) => ring.map(([x, y]) => [x, y, height])),
    );
    const [only] = coordinates;
    const geometry =
      coordinates.length === 1
        ? { type: 'Polygon', coordinates: only }
        : { type: 'MultiPolygon', coordinates };
    return { type: 'Feature', properties: attributes, geometry };
  });
  const named = crs === undefined ? {} : { crs: { type: 'name', properties: { name: crs } } };
  return Buffer.from(JSON.stringify({ type: 'FeatureCollection', features, ...named }));
}

/** A zipped Shapefile; outer rings clockwise and holes anticlockwise, all in one list. */
export function shapefileZip(rows: Rows, prj?: string): Buffer {
  const shapes = rows.map(({ parts }) => ({
    parts: parts.flat().map((ring) => [...ring].reverse()),
  }));
  const columns = columnsOf(rows).map((name) => ({ name, type: 'C', length: 60 }));
  const table = tableFile(
    columns,
    rows.map(({ attributes }) => columns.map(({ name }) => attributes[name] ?? '')),
  );
  return zipFile([
    { name: 'town.shp', content: shpFile('areas with heights', shapes) },
    { name: 'town.dbf', content: table },
    { name: 'town.cpg', content: 'UTF-8' },
    ...(prj === undefined ? [] : [{ name: 'town.prj', content: prj }]),
  ]);
}

export function wktOf(parts: Parts, height?: number): string {
  const z = height === undefined ? '' : ` ${height}`;
  const text = parts
    .map((part) => {
      const rings = part.map((ring) => `(${ring.map(([x, y]) => `${x} ${y}${z}`).join(', ')})`);
      return `(${rings.join(',')})`;
    })
    .join(', ');
  const dimension = height === undefined ? '' : ' Z';
  return parts.length === 1 ? `POLYGON${dimension} ${text}` : `MULTIPOLYGON${dimension} (${text})`;
}

function csvValue(value: string): string {
  return `"${value.replaceAll('"', '""')}"`;
}

/** CSV with footprints in well-known text, in a column whose name does not say so. */
export function csvFile(rows: Rows, delimiter: string, srid?: number): Buffer {
  const columns = columnsOf(rows);
  const lines = rows.map(({ parts, height, attributes }) => {
    const prefix = srid === undefined ? '' : `SRID=${srid};`;
    const values = columns.map((name) => attributes[name] ?? '');
    return [...values, prefix + wktOf(parts, height)].map(csvValue).join(delimiter);
  });
  return Buffer.from([[...columns, 'outline'].join(delimiter), ...lines].join('\r\n'));
}

/** A workbook with footprints in well-known text. */
export async function workbookFile(rows: Rows): Promise<Buffer> {
  const workbook = new ExcelJS.Workbook();
  const sheet = workbook.addWorksheet('Edificios');
  const columns = columnsOf(rows);
  sheet.addRow([...columns, 'outline']);
  for (const { parts, attributes } of rows) {
    sheet.addRow([...columns.map((name) => attributes[name] ?? null), wktOf(parts)]);
  }
  return Buffer.from(await workbook.xlsx.writeBuffer());
}

function wkbOf(parts: Parts, height: number, isLittle: boolean): Buffer {
  const bytes: Buffer[] = [];
  const byte = (value: number) => bytes.push(Buffer.from([value]));
  const uint32 = (value: number) => {
    const four = Buffer.alloc(4);
    if (isLittle) four.writeUInt32LE(value);
    else four.writeUInt32BE(value);
    bytes.push(four);
  };
  const double = (value: number) => {
    const eight = Buffer.alloc(8);
    if (isLittle) eight.writeDoubleLE(value);
    else eight.writeDoubleBE(value);
    bytes.push(eight);
  };
  byte(Number(isLittle));
  uint32(1006);
  uint32(parts.length);
  for (const part of parts) {
    byte(Number(isLittle));
    uint32(1003);
    uint32(part.length);
    for (const ring of part) {
      uint32(ring.length);
      for (const [x, y] of ring) [x, y, height].forEach(double);
    }
  }
  return Buffer.concat(bytes);
}

/** A geometry as GeoPackages keep it, with a box before it where that is asked for. */
export function geometryBlob(parts: Parts, height: number, isLittle = true): Buffer {
  const heading = Buffer.from([0x47, 0x50, 0, isLittle ? 0b11 : 0b10, 0, 0, 0, 0]);
  return Buffer.concat([heading, Buffer.alloc(32), wkbOf(parts, height, isLittle)]);
}

export type GivenLayer = {
  readonly name: string;
  readonly kind: string;
  readonly rows: Rows;
  readonly srs: number;
};

/** A GeoPackage of some layers, and what else is to be done to it by SQL. */
export async function geopackageFile(layers: readonly GivenLayer[], more = ''): Promise<Buffer> {
  const { Database } = await initSqlJs();
  const database = new Database();
  database.run(`
    create table gpkg_spatial_ref_sys (srs_name text, srs_id integer primary key, organization text,
      organization_coordsys_id integer, definition text, description text);
    insert into gpkg_spatial_ref_sys values
      ('Undefined', 0, 'NONE', 0, 'undefined', null),
      ('WGS 84', 4326, 'EPSG', 4326, 'GEOGCS["WGS 84"]', null),
      ('ETRS89 / UTM zone 30N', 25830, 'EPSG', 25830, 'PROJCS["ETRS89 / UTM zone 30N"]', null),
      ('A grid of ours', 100001, 'OURS', 1, 'PROJCS["ours"]', null);
    create table gpkg_contents (table_name text primary key, data_type text, identifier text, srs_id integer);
    create table gpkg_geometry_columns (table_name text, column_name text, geometry_type_name text,
      srs_id integer, z tinyint, m tinyint);`);
  for (const { name, kind, rows, srs } of layers) {
    const table = `"${name.replaceAll('"', '""')}"`;
    const columns = columnsOf(rows);
    database.run(`create table ${table} (fid integer primary key, geom ${kind}${columns.map((one) => `, "${one}" text`).join('')})`); // prettier-ignore
    database.run('insert into gpkg_contents values (?, ?, ?, ?)', [name, 'features', name, srs]);
    database.run('insert into gpkg_geometry_columns values (?, ?, ?, ?, 1, 0)', [name, 'geom', kind, srs]); // prettier-ignore
    const insert = database.prepare(`insert into ${table} values (null, ?${columns.map(() => ', ?').join('')})`); // prettier-ignore
    for (const [index, { parts, height, attributes }] of rows.entries()) {
      const blob = geometryBlob(parts, height, index % 2 === 0);
      insert.run([blob, ...columns.map((column) => attributes[column] ?? null)]);
    }
    insert.free();
  }
  if (more !== '') database.run(more);
  const file = Buffer.from(database.export());
  database.close();
  return file;
}
