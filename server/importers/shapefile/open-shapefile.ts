import { AppError } from '../../errors.ts';
import { noProperties } from '../flat-properties.ts';
import { RowFault } from '../geometry/row-fault.ts';
import type { Source, SourceRow } from '../source.ts';
import { unpackEntry } from '../unpack-entry.ts';
import type { ZipEntry } from '../zip-entries.ts';
import { codePage } from './code-page.ts';
import { dbfTable, type DbfTable } from './dbf-table.ts';
import { prjCrs } from './prj-crs.ts';
import { shapeOf, shapeRecords, type ShapeRecord } from './shape-records.ts';

type Shape = Pick<SourceRow, 'geometry' | 'fault'>;

function shapeOrFault(record: ShapeRecord): Shape {
  try {
    return { geometry: shapeOf(record), fault: null };
  } catch (error) {
    if (error instanceof RowFault) return { geometry: null, fault: error.message };
    throw error;
  }
}

function* rowsOf(shp: Buffer, table: DbfTable | undefined): Generator<SourceRow> {
  let count = 0;
  for (const record of shapeRecords(shp)) {
    count += 1;
    if (table !== undefined && count > table.count) break;
    const properties = table === undefined ? noProperties() : table.row(count - 1);
    if (properties !== undefined) yield { row: count, ...shapeOrFault(record), properties };
  }
  if (table !== undefined && count !== table.count) {
    const rows = table.count.toLocaleString('en-GB');
    const message = `The table beside the shapes has ${rows} rows, and there are not as many shapes. Export both again.`;
    throw new AppError('unreadable', message);
  }
}

/** Reads the one Shapefile among the files of an archive. */
export async function openShapefile(bytes: Buffer, entries: readonly ZipEntry[]): Promise<Source> {
  const shapes = entries.filter(({ name }) => /\.shp$/i.test(name));
  const [shape, ...others] = shapes;
  if (shape === undefined || others.length > 0) {
    const message = `The archive holds ${shapes.length} .shp files. It has to hold one.`;
    throw new AppError('unreadable', message);
  }
  const base = shape.name.slice(0, -'shp'.length).toLowerCase();
  const beside = async (extension: string) => {
    const entry = entries.find(({ name }) => name.toLowerCase() === base + extension);
    return entry && unpackEntry(bytes, entry);
  };
  const { crs, note } = prjCrs(await beside('prj'));
  const [dbf, cpg] = [await beside('dbf'), await beside('cpg')];
  const page = dbf && codePage(dbf, cpg?.toString('latin1').slice(0, 100));
  const table = dbf && page && dbfTable(dbf, page);
  const shp = await unpackEntry(bytes, shape);
  return {
    format: 'shapefile',
    kind: 'footprints',
    layer: null,
    crs,
    notes: [note, page?.note].filter((one) => one !== undefined),
    columns: table?.columns ?? [],
    rows: () => rowsOf(shp, table),
  };
}
