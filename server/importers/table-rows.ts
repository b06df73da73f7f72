import { IMPORT_LIMITS } from '../../shared/schemas/imports.ts';
import { AppError } from '../errors.ts';
import { noProperties } from './flat-properties.ts';
import { looksLikeGeometry, readGeometryText, sridOfText } from './geometry/geometry-text.ts';
import { looksLikeGeojson } from './geometry/geojson-text.ts';
import { RowFault } from './geometry/row-fault.ts';
import { WGS84 } from './named-crs.ts';
import { giveOnlyPoints } from './point-columns.ts';
import type { FileCrs, Scalar, SourceRow } from './source.ts';

/** A record of a table as people see it: its number, and a value for each column. */
export type TableRecord = { readonly row: number; readonly values: readonly Scalar[] };

export type Heading = {
  readonly columns: readonly string[];
  /** Which column holds footprints in well-known text, binary or GeoJSON. */
  readonly wkt: number | undefined;
  readonly crs: FileCrs | null;
};

const LONGEST_NAME = 300;

export function isBlank(value: Scalar | undefined): boolean {
  return value === null || value === undefined || (typeof value === 'string' && !/\S/.test(value));
}

export function tooWide(width: number): AppError {
  const found = width.toLocaleString('en-GB');
  const message = `The table has ${found} columns. At most ${IMPORT_LIMITS.columns} are taken.`;
  return new AppError('too-large', message);
}

/** Names of columns, each once and none blank. */
function columnNames(values: readonly Scalar[]): string[] {
  const names: string[] = [];
  for (const [index, value] of values.entries()) {
    const given = isBlank(value) ? `column ${index + 1}` : String(value).trim();
    const short = given.replaceAll(/\s+/g, ' ').slice(0, LONGEST_NAME - 10);
    let name = short;
    for (let k = 2; names.includes(name); k += 1) name = `${short} (${k})`;
    names.push(name);
  }
  return names;
}

/** The column in which most values are geometries, by what it holds and not by its name. */
function wktColumn(columns: number, sample: readonly TableRecord[]): number | undefined {
  const fits = Array.from({ length: columns }, (_, index) => {
    const filled = sample.map(({ values }) => values[index]).filter((value) => !isBlank(value));
    const texts = filled.filter((value) => typeof value === 'string' && looksLikeGeometry(value));
    return texts.length * 2 > filled.length ? texts.length : 0;
  });
  const most = Math.max(...fits);
  return most === 0 ? undefined : fits.indexOf(most);
}

function crsOf(wkt: number | undefined, sample: readonly TableRecord[]): FileCrs | null {
  if (wkt === undefined) return null;
  const texts = sample.map(({ values }) => values[wkt]).filter((one) => typeof one === 'string');
  const code = texts.map(sridOfText).find((one) => one !== undefined && one > 0);
  if (code !== undefined) return { code, said: `SRID=${code}` };
  return texts.some(looksLikeGeojson) ? WGS84 : null;
}

/** What the heading of a table says, and which column of a sample of its rows holds footprints. */
export function headingOf(names: readonly Scalar[], sample: readonly TableRecord[]): Heading {
  const width = names.findLastIndex((value) => !isBlank(value)) + 1;
  if (width > IMPORT_LIMITS.columns) throw tooWide(width);
  if (width === 0) throw new AppError('unreadable', 'The table has no row with names of columns.');
  if (names.some((value) => typeof value === 'string' && looksLikeGeometry(value))) {
    throw new AppError(
      'unreadable',
      'The first row holds values. It has to hold the names of the columns.',
    );
  }
  const columns = columnNames(names.slice(0, width));
  const wkt = wktColumn(width, sample);
  if (width === 1 && wkt === undefined) {
    const message =
      'The file is no table that can be read: it has one column. Separate values by commas, semicolons or tabs.';
    throw new AppError('unreadable', message);
  }
  if (wkt === undefined && giveOnlyPoints(columns)) {
    const message =
      'The table holds points by X and Y only, and points are not footprints. Export the outlines of the buildings as polygons.';
    throw new AppError('unreadable', message);
  }
  return { columns, wkt, crs: crsOf(wkt, sample) };
}

function geometryIn(value: Scalar | undefined): Pick<SourceRow, 'geometry' | 'fault'> {
  if (isBlank(value)) return { geometry: null, fault: null };
  try {
    return { geometry: readGeometryText(String(value)), fault: null };
  } catch (error) {
    if (error instanceof RowFault) return { geometry: null, fault: error.message };
    throw error;
  }
}

/** A row of a table: its values by column and the footprint in its geometry. */
export function tableRow({ columns, wkt }: Heading, { row, values }: TableRecord): SourceRow {
  const properties = noProperties();
  for (const [index, name] of columns.entries()) {
    const value = values[index] ?? null;
    if (index !== wkt) properties[name] = isBlank(value) ? null : value;
  }
  if (!values.slice(columns.length).every(isBlank)) {
    const fault = `It has ${values.length} values for ${columns.length} columns.`;
    return { row, geometry: null, fault, properties };
  }
  const shape = wkt === undefined ? { geometry: null, fault: null } : geometryIn(values[wkt]);
  return { row, ...shape, properties };
}
