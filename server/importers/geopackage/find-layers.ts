import type { Database } from 'sql.js';
import { AppError } from '../../errors.ts';
import { horizontalCode } from '../named-crs.ts';
import type { FileCrs } from '../source.ts';
import { notTaken } from '../taken-formats.ts';
import { query, quoted } from './open-database.ts';

export type Column = { readonly name: string; readonly isYesNo: boolean };

export type Layer = {
  readonly table: string;
  readonly geometry: string;
  readonly srs: number;
  readonly count: number;
};

const MOST_LAYERS = 200;
const AREAS = /^(MULTI)?(POLYGON|SURFACE)$|^CURVEPOLYGON$/i;
/** Words for buildings in names of layers, in some languages. */
const BUILDINGS = /build|bldg|footprint|edific|geb(ä|ae?)ude|b(â|a)ti|pand|fabbric|bygg|bygn/i;
const ANY = /^GEOM(ETRY|COLLECTION|ETRYCOLLECTION)$/i;

/** Tables that hold rows themselves: what views and other modules hold is made up while it is read. */
function isPlainTable(database: Database, name: string): boolean {
  const found = query(
    database,
    `select type, sql from main.sqlite_schema where name = ?1 collate nocase and type in ('table', 'view')`,
    [name],
  );
  const [type, sql] = [...found][0] ?? [];
  return type === 'table' && typeof sql === 'string' && /^\s*create\s+table\b/i.test(sql);
}

function text(value: unknown): string {
  return typeof value === 'string' ? value : '';
}

function countOf(database: Database, table: string): number {
  const [count] = [...query(database, `select count(*) from main.${quoted(table)}`)][0] ?? [];
  return typeof count === 'number' ? count : 0;
}

function rank({ kind, table }: { readonly kind: string; readonly table: string }): number {
  return (AREAS.test(kind) ? 2 : 0) + (BUILDINGS.test(table) ? 1 : 0);
}

/** The layers that may hold areas: those that say so first, then those called buildings, then the largest. */
export function findLayers(database: Database): Layer[] {
  for (const name of ['gpkg_contents', 'gpkg_geometry_columns', 'gpkg_spatial_ref_sys']) {
    if (!isPlainTable(database, name)) {
      throw notTaken('a SQLite database that is no GeoPackage', 'Save its layer as GeoPackage.');
    }
  }
  const rows = [
    ...query(
      database,
      `select c.table_name, g.column_name, g.geometry_type_name, g.srs_id
       from main.gpkg_contents c join main.gpkg_geometry_columns g on g.table_name = c.table_name collate nocase
       where c.data_type = 'features' limit ${MOST_LAYERS}`,
    ),
  ];
  const layers = rows
    .map(([table, geometry, kind, srs]) => ({
      table: text(table),
      geometry: text(geometry),
      kind: text(kind),
      srs: typeof srs === 'number' ? srs : 0,
    }))
    .filter(({ kind }) => AREAS.test(kind) || ANY.test(kind));
  if (layers.length === 0) {
    const what = rows.length === 0 ? 'no layer of features' : 'layers of points or lines only';
    const message = `The GeoPackage holds ${what}. Footprints are polygons.`;
    throw new AppError('unreadable', message);
  }
  const plain = layers.filter(({ table }) => isPlainTable(database, table));
  if (plain.length === 0) {
    const message = `The layer "${layers[0]?.table ?? ''}" is a view and no table. Export it as a layer of its own.`;
    throw new AppError('unreadable', message);
  }
  return plain
    .map((layer) => ({ ...layer, count: countOf(database, layer.table) }))
    .sort((a, b) => rank(b) - rank(a) || b.count - a.count);
}

/** The columns of a table that hold values themselves, without the geometry. */
export function columnsOf(database: Database, { table, geometry }: Layer): Column[] {
  return [...query(database, `select name, type, hidden from pragma_table_xinfo(?1)`, [table])]
    .filter(([name, , hidden]) => {
      return hidden === 0 && text(name).toLowerCase() !== geometry.toLowerCase();
    })
    .map(([name, type]) => ({ name: text(name), isYesNo: /^bool/i.test(text(type)) }));
}

/** The system that a layer is in, as the file's own list describes it. */
export async function crsOfLayer(database: Database, { srs }: Layer): Promise<FileCrs | null> {
  if (srs <= 0) return null;
  const sql = `select srs_name, organization, organization_coordsys_id, definition
    from main.gpkg_spatial_ref_sys where srs_id = ?1`;
  const [name, organization, id, definition] = [...query(database, sql, [srs])][0] ?? [];
  const wkt = /[[(]/.test(text(definition)) ? { wkt: text(definition).slice(0, 10_000) } : {};
  const isEpsg = /^epsg$/i.test(text(organization)) && typeof id === 'number';
  if (!isEpsg) return { ...wkt, said: text(name).slice(0, 200) || `system ${srs}` };
  return { code: await horizontalCode(id), ...wkt, said: `EPSG:${id}` };
}
