import type { HostileFile } from './hostile-file.ts';

const POLYGON = 'POLYGON((3 54,3.1 54,3.1 54.1,3 54))';

/** Tables of text that are broken, endless or no tables. */
export const TABLE_FILES: readonly HostileFile[] = [
  { name: 'an empty file', make: () => '', says: /The file is empty/ },
  {
    name: 'CSV of one line of 100 MB',
    make: () => 'abcdefghi '.repeat(10_000_000),
    says: /Row 1 is longer than 2 MB/,
  },
  {
    name: 'CSV with a second line of 100 MB',
    make: () => `a,b\n${'abcdefghi,'.repeat(10_000_000)}`,
    says: /Row 2 is longer than 2 MB/,
  },
  {
    name: 'CSV of 10,000 columns',
    make: () => `${Array.from({ length: 10_000 }, (_, k) => `c${k}`).join(';')}\n1;2\n`,
    says: /^too-large: The table has 10,000 columns\. At most 200 are taken/,
  },
  {
    name: 'CSV of commas only',
    make: () => `a,b\n${`${','.repeat(1_900_000)}\n`.repeat(50)}`,
    says: /^too-large: The table has 1,900,001 columns/,
  },
  {
    name: 'CSV with more rows than are taken',
    make: () => `a,b\n${'1,2\n'.repeat(200_001)}`,
    says: /^too-large: .*more than 200,000 rows/,
  },
  {
    name: 'CSV with a quotation mark that is not closed',
    make: () => `a,b\n1,"2\n${'3,4\n'.repeat(100)}`,
    says: /A quotation mark in row 2 is not closed/,
  },
  {
    name: 'CSV without names of columns',
    make: () => `1,"${POLYGON}"\n2,"${POLYGON}"`,
    says: /It has to hold the names of the columns/,
  },
  {
    name: 'CSV of one column',
    make: () => 'Dear reader\nthis is no table\n',
    says: /it has one column/,
  },
  { name: 'CSV of a heading only', make: () => 'reference,use\n', says: /holds no rows/ },
  {
    name: 'well-known text with a million brackets',
    make: () => `a,wkt\n1,"POLYGON${'('.repeat(1_000_000)}"`,
    says: /well-known text is damaged at letter 10: "\(\(\(/,
  },
  {
    name: 'well-known text that is cut off',
    make: () => `a,wkt\n1,"${POLYGON.slice(0, -6)}"`,
    says: /well-known text is damaged at letter 31: it ends too early/,
  },
  {
    name: 'well-known text of points',
    make: () => `a,wkt\n1,POINT(3 54)\n2,POINT(3 55)`,
    says: /none of its 2 rows is right\. Row 2: It is a point/,
  },
  {
    name: 'well-known text with curves',
    make: () => `a,wkt\n1,"CURVEPOLYGON(CIRCULARSTRING(0 0,1 1,2 0,1 -1,0 0))"`,
    says: /It has curves, which are not taken/,
  },
  { name: 'zeros', make: () => Buffer.alloc(1_000_000), says: /not a text in UTF-8/ },
];

function foreign(name: string, content: string | Buffer, says: RegExp): HostileFile {
  return { name, make: () => content, says };
}

/** Files of formats that are not taken. */
export const FOREIGN_FILES: readonly HostileFile[] = [
  foreign('a PDF', '%PDF-1.7\n%', /seems to be a PDF\. Taken are GeoJSON/),
  foreign('a web page', '<!DOCTYPE html><html><body>', /seems to be a web page/),
  foreign('GML', '<?xml version="1.0"?><wfs:FeatureCollection xmlns:gml="http://www.opengis.net/gml">', /seems to be GML\. Save it as GeoJSON or GeoPackage/), // prettier-ignore
  foreign('CityGML', '<CityModel xmlns="http://www.opengis.net/citygml/2.0" xmlns:gml="http://www.opengis.net/gml">', /seems to be CityGML\. Convert it to CityJSON/), // prettier-ignore
  foreign('KML', '\uFEFF<kml xmlns="http://www.opengis.net/kml/2.2">', /seems to be KML/),
  foreign('XML', '<a/>', /seems to be XML/),
  foreign('a DXF drawing', '  0\r\nSECTION\r\n  2\r\nHEADER\r\n', /seems to be a DXF drawing/),
  foreign('a picture', Buffer.from('89504e470d0a1a0a', 'hex'), /seems to be a picture/),
  foreign('a 7z archive', Buffer.from('377abcaf271c0004', 'hex'), /seems to be a 7z archive/),
  foreign('a RAR archive', 'Rar!\u001a\u0007', /seems to be a RAR archive/),
  foreign('a gzip archive', Buffer.from('1f8b0800', 'hex'), /seems to be a gzip archive/),
  foreign('an old workbook', Buffer.from('d0cf11e0a1b11ae1', 'hex'), /Save it as XLSX/),
  foreign('a bare .shp', Buffer.from('0000270a00000000', 'hex'), /Zip it together with its \.dbf/),
];
