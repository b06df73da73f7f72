import type { HostileFile } from './hostile-file.ts';
import { zipFile, type ZipFile } from './zip-file.ts';

const MB = 1024 * 1024;
const CONTENT_TYPES: ZipFile = { name: '[Content_Types].xml', content: '<Types/>' };
const WORKBOOK: ZipFile = {
  name: 'xl/workbook.xml',
  content: '<workbook xmlns:r="r"><sheets><sheet name="A" r:id="r1"/></sheets></workbook>',
};
const RELATIONS: ZipFile = {
  name: 'xl/_rels/workbook.xml.rels',
  content: '<Relationships><Relationship Id="r1" Target="worksheets/sheet1.xml"/></Relationships>',
};

function sheetFile(content: string): ZipFile {
  return { name: 'xl/worksheets/sheet1.xml', content };
}

function text(reference: string, value: string): string {
  return `<c r="${reference}" t="inlineStr"><is><t>${value}</t></is></c>`;
}

/** A workbook of one sheet, and other parts of it. */
export function workbookOf(sheet: string, ...others: readonly ZipFile[]): Buffer {
  return zipFile([CONTENT_TYPES, WORKBOOK, RELATIONS, sheetFile(sheet), ...others]);
}

/** A sheet of rows, with what stands before and behind them. */
export function sheetOf(rows: string, before = '', behind = ''): string {
  return `<worksheet>${before}<sheetData>${rows}</sheetData>${behind}</worksheet>`;
}

const HEADING = `<row r="1">${text('A1', 'reference')}${text('B1', 'use')}</row>`;

/** Noise that does not pack. */
function noise(length: number): Buffer {
  const bytes = Buffer.alloc(length);
  let state = 7;
  for (let k = 0; k < length; k += 1) {
    state = (Math.imul(state, 1103515245) + 12345) & 0x7fffffff;
    bytes[k] = state >> 16;
  }
  return bytes;
}

function shape(points: number, claimed: number): Buffer {
  const bytes = Buffer.alloc(100 + 8 + 48 + 16 * points);
  bytes.writeInt32BE(9994);
  bytes.writeInt32BE(bytes.length / 2, 24);
  bytes.writeInt32BE(1, 100);
  bytes.writeInt32BE((bytes.length - 108) / 2, 104);
  bytes.writeInt32LE(5, 108);
  bytes.writeInt32LE(1, 144);
  bytes.writeInt32LE(claimed, 148);
  return bytes;
}

/** Archives that grow, lead elsewhere or hold something else. */
export const ARCHIVE_FILES: readonly HostileFile[] = [
  {
    name: 'a zip bomb of 300 MB',
    make: () => zipFile([{ name: 'a.shp', content: Buffer.alloc(300 * MB) }]),
    says: /"a\.shp" unpacks to far too much/,
  },
  {
    name: 'a zip that unpacks to more than it says',
    make: () => zipFile([{ name: 'a.geojson', content: Buffer.alloc(50 * MB), claims: { unpacked: 1000 } }]), // prettier-ignore
    says: /"a\.geojson" is damaged/,
  },
  {
    name: 'a zip whose files claim 500 MB',
    make: () => zipFile([{ name: 'a.shp', content: noise(3 * MB), claims: { unpacked: 500 * MB } }]), // prettier-ignore
    says: /^too-large: .*more than 400 MB/,
  },
  {
    name: 'a zip that leads out of its folder',
    make: () => zipFile([{ name: '../../etc/a.shp', content: 'x' }]),
    says: /leads out of the archive/,
  },
  {
    name: 'a zip in a zip',
    make: () => zipFile([{ name: 'a.zip', content: zipFile([{ name: 'b.shp', content: 'x' }]) }]),
    says: /is an archive in the archive/,
  },
  {
    name: 'a zip in a zip under another name',
    make: () => zipFile([{ name: 'a.geojson', content: zipFile([{ name: 'b', content: 'x' }]) }]),
    says: /it holds an archive/,
  },
  {
    name: 'a zip of 70,000 files',
    make: () =>
      zipFile(Array.from({ length: 70_000 }, (_, k) => ({ name: `${k}.txt`, content: '' }))),
    says: /more than 1,000 files/,
  },
  {
    name: 'a zip that is cut off',
    make: () => zipFile([{ name: 'a.shp', content: noise(MB) }]).subarray(0, MB / 2),
    says: /its end is missing/,
  },
  {
    name: 'a zip with GML',
    make: () => zipFile([{ name: 'town.gml', content: '<gml/>' }]),
    says: /GML \("town\.gml"\)\. Save it as GeoJSON or GeoPackage\. Taken are GeoJSON/,
  },
  {
    name: 'a file geodatabase',
    make: () => zipFile([{ name: 'a.gdb/a00000001.gdbtable', content: 'x' }]),
    says: /file geodatabase.*Save its layer as GeoPackage/,
  },
  {
    name: 'a Word document',
    make: () => zipFile([CONTENT_TYPES, { name: 'word/document.xml', content: '<x/>' }]),
    says: /a Word document/,
  },
  {
    name: 'a Shapefile whose record claims two thousand million points',
    make: () => zipFile([{ name: 'a.shp', content: shape(4, 2_000_000_000) }]),
    says: /record 1 is damaged/,
  },
  {
    name: 'a Shapefile with a ring of 900,000 corners',
    make: () => zipFile([{ name: 'a.shp', content: shape(900_000, 900_000) }]),
    says: /unpacks to far too much|more than 10,000 corners/,
  },
  {
    name: 'a Shapefile that is cut off',
    make: () => zipFile([{ name: 'a.shp', content: shape(40, 40).subarray(0, 300) }]),
    says: /the end of the file is missing/,
  },
  {
    name: 'a workbook with a value in XFD1048576',
    make: () => workbookOf(sheetOf(`${HEADING}<row r="1048576">${text('XFD1048576', 'x')}</row>`, '<dimension ref="A1:XFD1048576"/>')), // prettier-ignore
    says: /^too-large: Row 1048576 of the sheet has values in column 16384/,
  },
  {
    name: 'a workbook with entities that grow',
    make: () => workbookOf(`<!DOCTYPE x [<!ENTITY a "aaaaaaaaaa"><!ENTITY b "&a;&a;&a;&a;">]><worksheet>&b;</worksheet>`), // prettier-ignore
    says: /declares entities of its own/,
  },
  {
    name: 'a workbook with a bomb of texts',
    make: () => {
      const content = `<sst>${'<si><t>x</t></si>'.repeat(15_000_000)}</sst>`;
      return workbookOf(sheetOf(HEADING), { name: 'xl/sharedStrings.xml', content });
    },
    says: /unpacks to far too much/,
  },
  {
    name: 'a workbook with more rows than are taken',
    make: () => {
      // with noise between, so that it packs like a workbook and not like a bomb
      const cell = (k: number) => `<row r="${k + 2}"><c r="A${k + 2}"><v>${(k * 7919) % 99_991}</v></c></row>`; // prettier-ignore
      return workbookOf(
        sheetOf(HEADING + Array.from({ length: 200_001 }, (_, k) => cell(k)).join('')),
      );
    },
    says: /^too-large: .*more than 200,000 rows/,
  },
  {
    name: 'a workbook whose heading is merged',
    make: () => workbookOf(sheetOf(`${HEADING}<row r="2">${text('A2', 'x')}</row>`, '', '<mergeCells><mergeCell ref="A1:B1"/></mergeCells>')), // prettier-ignore
    says: /cells A1:B1 of the heading are merged/,
  },
  {
    name: 'a workbook of numbers',
    make: () =>
      workbookOf(sheetOf('<row r="1"><c r="A1"><v>1</v></c><c r="B1"><v>2</v></c></row>')),
    says: /No sheet of the workbook has a row with names/,
  },
  {
    name: 'a workbook that is damaged inside',
    make: () => workbookOf(`<worksheet><sheetData>${HEADING}<row`),
    says: /"A" is damaged/,
  },
];
