import type { Database, SqlValue } from 'sql.js';
import { AppError } from '../../errors.ts';
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

function noteOn(taken: Layer, layers: readonly Layer[]): string[] {
  const others = layers.filter((layer) => layer !== taken);
  if (others.length === 0) return [];
  const names = others.slice(0, 5).map(({ table }) => `"${table}"`);
  return [`The layer "${taken.table}" was taken. There is also ${names.join(', ')}.`];
}

type Opened = Pick<Source, 'crs' | 'notes'> & {
  readonly layer: Layer;
  readonly layers: readonly string[];
  readonly columns: readonly Column[];
};

function chosen(layers: readonly Layer[], wanted: string | undefined): Layer {
  const layer = wanted === undefined ? layers[0] : layers.find(({ table }) => table === wanted);
  if (layer === undefined) throw new AppError('unreadable', 'The file has no such layer.');
  return layer;
}

async function lookInto(bytes: Buffer, wanted: string | undefined): Promise<Opened> {
  const database = await openDatabase(bytes);
  try {
    const layers = findLayers(database);
    const layer = chosen(layers, wanted);
    const crs = await crsOfLayer(database, layer);
    const names = layers.length === 1 ? [] : layers.map(({ table }) => table);
    const columns = columnsOf(database, layer);
    return { layer, layers: names, crs, notes: noteOn(layer, layers), columns };
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

/**
 * Reads the layer of a GeoPackage that holds areas; where several do the one that is wanted, or one called
 * buildings, else the largest.
 */
export async function openGeopackage(bytes: Buffer, layer?: string): Promise<Source> {
  const opened = await lookInto(bytes, layer);
  return {
    format: 'geopackage',
    kind: 'footprints',
    layer: opened.layer.table,
    layers: opened.layers,
    crs: opened.crs,
    notes: opened.notes,
    columns: opened.columns.map(({ name }) => name),
    rows: () => readLayer(bytes, opened),
  };
}
