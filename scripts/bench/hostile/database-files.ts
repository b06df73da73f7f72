import initSqlJs from 'sql.js';
import type { HostileFile } from './hostile-file.ts';

const TABLES = `
  create table gpkg_spatial_ref_sys (srs_name text, srs_id integer primary key, organization text,
    organization_coordsys_id integer, definition text, description text);
  create table gpkg_contents (table_name text primary key, data_type text, identifier text, srs_id integer);
  create table gpkg_geometry_columns (table_name text, column_name text, geometry_type_name text,
    srs_id integer, z tinyint, m tinyint);`;
const ENDLESS = `with recursive n(k) as (select 1 union all select k + 1 from n) select k as fid, null as geom from n`;

async function databaseOf(sql: string): Promise<Buffer> {
  const { Database } = await initSqlJs();
  const database = new Database();
  database.run(sql);
  const bytes = Buffer.from(database.export());
  database.close();
  return bytes;
}

/** A GeoPackage with a layer "a" of such a kind, made by such SQL. */
function packageOf(kind: string, sql: string): Promise<Buffer> {
  return databaseOf(`${TABLES}
    insert into gpkg_contents values ('a', 'features', 'a', 0);
    insert into gpkg_geometry_columns values ('a', 'geom', '${kind}', 0, 0, 0);
    ${sql}`);
}

function blob(wkb: string): string {
  return `create table a (fid integer primary key, geom blob); insert into a values (1, x'4750000100000000${wkb}');`;
}

/** Databases that are damaged, endless or no GeoPackages. */
export const DATABASE_FILES: readonly HostileFile[] = [
  {
    name: 'a SQLite database',
    make: () => databaseOf('create table a (b)'),
    says: /a SQLite database that is no GeoPackage/,
  },
  {
    name: 'a GeoPackage that is cut off',
    make: async () => (await packageOf('POLYGON', blob('01'))).subarray(0, 9000),
    says: /the end of the file is missing/,
  },
  {
    name: 'noise behind the heading of SQLite',
    make: () => `SQLite format 3\0${'x'.repeat(20_000)}`,
    says: /cannot be read: (the file is damaged|the end of the file is missing)/,
  },
  {
    name: 'a GeoPackage whose layer is an endless view',
    make: () => packageOf('POLYGON', `create view a as ${ENDLESS};`),
    says: /"a" is a view and no table/,
  },
  {
    name: 'a GeoPackage whose list is an endless view',
    make: () => databaseOf(TABLES.replace('create table gpkg_contents (table_name text primary key, data_type text, identifier text, srs_id integer)', `create view gpkg_contents as ${ENDLESS}`)), // prettier-ignore
    says: /a SQLite database that is no GeoPackage/,
  },
  {
    name: 'a GeoPackage with an endless column',
    make: () => packageOf('POLYGON', `create table a (fid integer primary key, geom blob, b generated always as (length(hex(zeroblob(400000000)))));
      insert into a values (1, x'00');`), // prettier-ignore
    says: /Its geometry is damaged/,
  },
  {
    name: 'a GeoPackage of points',
    make: () => packageOf('POINT', 'create table a (fid integer primary key, geom blob)'),
    says: /layers of points or lines only/,
  },
  {
    name: 'a GeoPackage whose polygon claims four thousand million rings',
    make: () => packageOf('POLYGON', blob('0103000000ffffffff')),
    says: /Its geometry is damaged/,
  },
  {
    name: 'a GeoPackage with collections in collections',
    make: () => packageOf('GEOMETRY', blob('010700000001000000'.repeat(2000))),
    says: /Its geometry is damaged/,
  },
  {
    name: 'a GeoPackage with curves',
    make: () => packageOf('CURVEPOLYGON', blob('010a00000001000000010800000000000000')),
    says: /curves or faces in space/,
  },
  {
    name: 'a GeoPackage with more rows than are taken',
    make: () => packageOf('POLYGON', `create table a (fid integer primary key, geom blob);
      with recursive n(k) as (select 1 union all select k + 1 from n where k <= 200000) insert into a select k, null from n;`), // prettier-ignore
    says: /^too-large: .*more than 200,000 rows/,
  },
];
