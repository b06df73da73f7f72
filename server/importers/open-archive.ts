import { AppError } from '../errors.ts';
import { checkZip } from './check-zip.ts';
import { notTaken } from './taken-formats.ts';
import { openShapefile } from './shapefile/open-shapefile.ts';
import type { Source } from './source.ts';
import { unpackEntry } from './unpack-entry.ts';
import { openWorkbook } from './xlsx/open-workbook.ts';
import { zipEntries, type ZipEntry } from './zip-entries.ts';

/** What an archive may hold instead of a Shapefile: one file of another format. */
const READABLE = /\.(geojson|geojsonl|json|jsonl|gpkg|csv|tsv|txt)$/i;

const FOREIGN: readonly (readonly [RegExp, string, string])[] = [
  [/\.gml$/i, 'an archive with GML', 'Save it as GeoJSON or GeoPackage.'],
  [/\.km[lz]$/i, 'an archive with KML', 'Save it as GeoJSON.'],
  [/\.gdb\//i, 'a file geodatabase', 'Save its layer as GeoPackage.'],
  [/\.gdbtable$/i, 'a file geodatabase', 'Save its layer as GeoPackage.'],
  [/^word\//, 'a Word document', 'Save the table in it as XLSX or CSV.'],
  [/^ppt\//, 'a presentation', ''],
  [/^content\.xml$/, 'an OpenDocument file', 'Save it as XLSX or CSV.'],
  [/\.(dxf|dwg)$/i, 'an archive with a drawing', 'Export its footprints as a Shapefile.'],
  [/\.(tab|mif|mid)$/i, 'an archive with a MapInfo table', 'Save it as GeoPackage.'],
  [/\.xml$/i, 'an archive with XML', ''],
];

function isBeside({ name }: ZipEntry): boolean {
  return name.endsWith('/') || name.startsWith('__MACOSX/') || /(^|\/)\._/.test(name);
}

function foreignArchive(entries: readonly ZipEntry[]): AppError {
  for (const [words, what, cure] of FOREIGN) {
    const found = entries.find(({ name }) => words.test(name));
    if (found !== undefined) return notTaken(`${what} ("${found.name.slice(0, 100)}")`, cure);
  }
  return new AppError(
    'unreadable',
    'The archive holds 0 .shp files, nor one other file that can be read. It has to hold one.',
  );
}

/** Reads what an archive holds: a workbook, a Shapefile, or one file of another format. */
export async function openArchive(
  bytes: Buffer,
  openInner: (bytes: Buffer) => Promise<Source>,
): Promise<Source> {
  const all = zipEntries(bytes);
  checkZip(all, bytes.length);
  const entries = all.filter((entry) => !isBeside(entry));
  if (entries.some(({ name }) => name === 'xl/workbook.xml')) return openWorkbook(bytes, entries);
  if (entries.some(({ name }) => /\.shp$/i.test(name))) return openShapefile(bytes, entries);
  const readable = entries.filter(({ name }) => READABLE.test(name));
  // a text beside the data is a licence or a description
  const data = readable.filter(({ name }) => !/\.txt$/i.test(name));
  const [one, ...others] = data.length === 0 ? readable : data;
  if (one === undefined) throw foreignArchive(entries);
  if (others.length > 0) {
    const message = `The archive holds several files that could be read, such as "${one.name}". It has to hold one.`;
    throw new AppError('unreadable', message);
  }
  return openInner(await unpackEntry(bytes, one));
}
