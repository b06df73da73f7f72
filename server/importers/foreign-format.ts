import { notTaken } from './taken-formats.ts';
import type { AppError } from '../errors.ts';

type Foreign = { readonly what: string; readonly cure?: string };

const HEAD = 4096;
const UNPACK = 'Unpack it, or pack it as a ZIP.';
const EXPORT = 'Export its footprints from the program that made it.';

/** Beginnings of files that are no text, as Latin letters. */
const BINARY: readonly (readonly [RegExp, Foreign])[] = [
  [/^%PDF/, { what: 'a PDF' }],
  [/^\x89PNG|^\xff\xd8\xff|^GIF8|^BM.{4}\0|^RIFF....WEBP|^II\*\0|^MM\0\*/s, { what: 'a picture' }],
  [/^7z\xbc\xaf/, { what: 'a 7z archive', cure: UNPACK }],
  [/^Rar!/, { what: 'a RAR archive', cure: UNPACK }],
  [/^\x1f\x8b/, { what: 'a gzip archive', cure: UNPACK }],
  [/^BZh\d|^\xfd7zXZ|^\x28\xb5\x2f\xfd/, { what: 'a packed file', cure: UNPACK }],
  [/^.{257}ustar/s, { what: 'a tar archive', cure: UNPACK }],
  [/^\xd0\xcf\x11\xe0/, { what: 'an old Excel workbook or another Office file', cure: 'Save it as XLSX.' }], // prettier-ignore
  [/^\0\0\x27\x0a/, { what: 'a bare .shp or .shx file', cure: 'Zip it together with its .dbf, .shx and .prj.' }], // prettier-ignore
  [/^[\x03\x30\x31\x83\x8b\xf5].{11}\0\0/s, { what: 'a bare .dbf table', cure: 'Zip it together with its .shp and .prj.' }], // prettier-ignore
  [/^AC10\d\d/, { what: 'a DWG drawing', cure: EXPORT }],
  [/^AutoCAD Binary DXF/, { what: 'a DXF drawing', cure: EXPORT }],
  [/^fgb\x03/, { what: 'a FlatGeobuf', cure: 'Save it as GeoPackage.' }],
  [/^PAR1/, { what: 'a Parquet file', cure: 'Save it as GeoPackage.' }],
  [/^ISO-10303-21/, { what: 'an IFC model', cure: EXPORT }],
  [/^LASF/, { what: 'a point cloud' }],
  [/^\x7fELF|^MZ/, { what: 'a program' }],
];

/** Words in the first lines of XML. */
const XML: readonly (readonly [RegExp, Foreign])[] = [
  [/<!doctype html|<html/i, { what: 'a web page', cure: 'The download may have failed.' }],
  [/<kml\b|earth\.google\.com\/kml|opengis\.net\/kml/i, { what: 'KML', cure: 'Save it as GeoJSON.' }], // prettier-ignore
  [/opengis\.net\/citygml/i, { what: 'CityGML', cure: 'Convert it to CityJSON.' }],
  [/opengis\.net\/gml|<gml:|xmlns:gml|<wfs:/i, { what: 'GML', cure: 'Save it as GeoJSON or GeoPackage.' }], // prettier-ignore
  [/<svg/i, { what: 'an SVG picture' }],
  [/<LandXML/i, { what: 'LandXML', cure: EXPORT }],
  [/<osm\b/i, { what: 'OpenStreetMap XML', cure: 'Save its buildings as GeoJSON.' }],
  [/<gpx/i, { what: 'a GPX track' }],
];

const DXF = /^\s*(999\s*[\r\n][^\r\n]*[\r\n]+\s*)?0\s*[\r\n]+\s*SECTION\b/;

function found(list: readonly (readonly [RegExp, Foreign])[], head: string): Foreign | undefined {
  return list.find(([words]) => words.test(head))?.[1];
}

function foreignText(head: string): Foreign | undefined {
  if (DXF.test(head)) return { what: 'a DXF drawing', cure: EXPORT };
  if (!/^\s*</.test(head)) return undefined;
  return found(XML, head) ?? { what: 'XML', cure: EXPORT };
}

/** A refusal where a file is of a format that is not taken; told by what it holds, never by its name. */
export function foreignFormat(bytes: Buffer): AppError | undefined {
  const head = bytes.toString('latin1', 0, HEAD);
  const foreign = found(BINARY, head) ?? foreignText(head.replace(/^\xef\xbb\xbf/, ''));
  return foreign && notTaken(foreign.what, foreign.cure);
}
