import proj4 from 'proj4';
import { parseShp } from 'shpjs';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { AppError } from '../errors.ts';
import { checkShapes } from './check-shapes.ts';
import { checkZip } from './check-zip.ts';
import type { Drawing } from './drawing.ts';
import { tableNames } from './table-names.ts';
import { unpackEntry } from './unpack-entry.ts';
import { zipEntries, type ZipEntry } from './zip-entries.ts';

const LONGEST_PRJ = 10_000;

function isOfMac({ name }: ZipEntry): boolean {
  return name.startsWith('__MACOSX/') || /(^|\/)\._/.test(name);
}

/** Turns the grid that a .prj file describes into longitude and latitude. */
function placeOf(prj: Buffer | undefined): Drawing['place'] {
  if (prj === undefined) {
    const message =
      'The archive has no .prj file, so nobody can tell which grid the shapes are in.';
    throw new AppError('unreadable', message);
  }
  try {
    if (prj.length > LONGEST_PRJ) throw new Error('too long');
    const text = prj.toString('utf8');
    proj4(text);
    return toLonLat(text);
  } catch {
    throw new AppError('unreadable', 'The .prj file describes a grid that is not known here.');
  }
}

function shapesOf(shp: Buffer): unknown[] {
  checkShapes(shp);
  try {
    return parseShp(shp);
  } catch {
    throw new AppError('unreadable', 'The shapes cannot be read: the file is damaged.');
  }
}

/** Reads the one Shapefile of a zipped archive: its shapes, their names and their grid. */
export async function readShapefile(bytes: Buffer): Promise<Drawing> {
  const entries = zipEntries(bytes).filter((entry) => !isOfMac(entry));
  checkZip(entries, bytes.length);
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
  const place = placeOf(await beside('prj'));
  const [table, page] = [await beside('dbf'), await beside('cpg')];
  const names = table === undefined ? [] : tableNames(table, page?.toString('latin1'));
  const geometries = shapesOf(await unpackEntry(bytes, shape));
  return {
    place,
    features: geometries.map((geometry, row) => ({ geometry, name: names[row] })),
  };
}
