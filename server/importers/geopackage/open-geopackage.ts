import type { Database, SqlValue } from 'sql.js';
import { noProperties } from '../flat-properties.ts';
import { RowFault } from '../geometry/row-fault.ts';
import type { Properties, Scalar, Source, SourceRow } from '../source.ts';
import { columnsOf, crsOfLayer, findLayers, type Column, type Layer } from './find-layers.ts';
import { readGeometryBlob } from './geometry-blob.ts';
import { openDatabase, query, quoted, type Values } from './open-database.ts';

function scalarOf(value: SqlValue | undefined, { isYesNo }: Column): Scalar {
  if (isYesNo && (value === 0 || value === 1)) return value === 1;
  return typeof value === 'string' || typeof value === 'number' ? value : null;
}

function propertiesOf(columns: readonly Column[], values: Values): Properties {
  const properties = noProperties();
  for (const [index, column] of columns.entries()) {
    properties[column.name] = scalarOf(values[index], column);
  }
  return properties;
}

function geometryIn(value: SqlValue | undefined): Pick<SourceRow, 'geometry' | 'fault'> {
  if (!(value instanceof Uint8Array)) return { geometry: null, fault: null };
  try {
    return { geometry: readGeometryBlob(value), fault: null };
  } catch (error) {
    if (error instanceof RowFault) return { geometry: null, fault: error.message };
    throw error;
  }
}

/** Reads by the order in which rows are kept, so that nothing is sorted and no index is asked. */
function* rowsOf(
  database: Database,
  layer: Layer,
  columns: readonly Column[],
): Generator<SourceRow> {
  const names = [...columns.map(({ name }) => name), layer.geometry].map(quoted).join(', ');
  const sql = `select ${names} from main.${quoted(layer.table)} not indexed`;
  let row = 0;
  for (const values of query(database, sql)) {
    row += 1;
    const properties = propertiesOf(columns, values);
    yield { row, ...geometryIn(values[columns.length]), properties };
  }
}

function noteOn(layers: readonly Layer[]): string[] {
  const [taken, ...others] = layers;
  if (taken === undefined || others.length === 0) return [];
  const names = others.slice(0, 5).map(({ table }) => `"${table}"`);
  return [
    `The layer "${taken.table}" was taken. There is also ${names.join(', ')}: to take another, send it alone.`,
  ];
}

type Opened = Pick<Source, 'crs' | 'notes'> & {
  readonly layer: Layer;
  readonly columns: readonly Column[];
};

async function lookInto(bytes: Buffer): Promise<Opened> {
  const database = await openDatabase(bytes);
  try {
    const layers = findLayers(database);
    const [layer] = layers;
    if (layer === undefined) throw new Error('layers are found or refused');
    const crs = await crsOfLayer(database, layer);
    return { layer, crs, notes: noteOn(layers), columns: columnsOf(database, layer) };
  } finally {
    database.close();
  }
}

async function* readLayer(bytes: Buffer, { layer, columns }: Opened): AsyncGenerator<SourceRow> {
  const database = await openDatabase(bytes);
  try {
    yield* rowsOf(database, layer, columns);
  } finally {
    database.close();
  }
}

/** Reads the layer of a GeoPackage that holds areas; where several do, one called buildings, else the largest. */
export async function openGeopackage(bytes: Buffer): Promise<Source> {
  const opened = await lookInto(bytes);
  return {
    format: 'geopackage',
    kind: 'footprints',
    layer: opened.layer.table,
    crs: opened.crs,
    notes: opened.notes,
    columns: opened.columns.map(({ name }) => name),
    rows: () => readLayer(bytes, opened),
  };
}
