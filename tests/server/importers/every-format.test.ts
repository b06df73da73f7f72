import { describe, expect, test } from 'vitest';
import type { UploadRow } from '../../../server/importers/upload.ts';
import { cityjsonFile } from '../../support/cityjson-file.ts';
import {
  csvFile,
  geojsonFile,
  geopackageFile,
  shapefileZip,
  workbookFile,
} from '../../support/footprint-files.ts';
import { areaOf, inDegrees, twinTown, type TwinRow } from '../../support/twin-town.ts';
import { rowsOf, uploadOf } from '../../support/upload-of.ts';

const METRES = twinTown();
const DEGREES = inDegrees(METRES);
const UTM_30_PRJ = 'PROJCS["ETRS_1989_UTM_Zone_30N",GEOGCS["GCS_ETRS_1989"]]';
const WGS_84_PRJ = 'GEOGCS["GCS_WGS_1984",DATUM["D_WGS_1984"]]';

type Made = Buffer | Promise<Buffer>;

const FILES: readonly (readonly [string, object, (rows: readonly TwinRow[]) => Made])[] = [
  ['GeoJSON in 25830', { code: 25830 }, () => geojsonFile(METRES, 'urn:ogc:def:crs:EPSG::25830')],
  ['GeoJSON in degrees', { code: 4326 }, () => geojsonFile(DEGREES)],
  ['Shapefile in 25830', { wkt: UTM_30_PRJ }, () => shapefileZip(METRES, UTM_30_PRJ)],
  ['Shapefile in degrees', { wkt: WGS_84_PRJ }, () => shapefileZip(DEGREES, WGS_84_PRJ)],
  ['GeoPackage in 25830', { code: 25830 }, () => geopackageFile([layer(METRES, 25830)])],
  ['GeoPackage in degrees', { code: 4326 }, () => geopackageFile([layer(DEGREES, 4326)])],
  ['CSV in 25830', { code: 25830 }, () => csvFile(METRES, ';', 25830)],
  ['CSV in degrees', { code: 4326 }, () => csvFile(DEGREES, ',', 4326)],
  ['CityJSON in 25830', { code: 25830 }, () => city(METRES, 25830)],
  ['CityJSON in degrees', { code: 4326 }, () => city(DEGREES, 4326)],
  ['CityJSON line by line', { code: 25830 }, () => city(METRES, 25830, { lines: true })],
  ['CityJSON without semantics', { code: 25830 }, () => city(METRES, 25830, { semantics: false })],
];

function layer(rows: readonly TwinRow[], srs: number) {
  return { name: 'buildings', kind: 'MULTIPOLYGON', rows, srs };
}

function city(rows: readonly TwinRow[], code: number, more: object = {}): Buffer {
  return cityjsonFile(rows, { crs: `https://www.opengis.net/def/crs/EPSG/0/${code}`, ...more });
}

function holesOf({ geometry }: UploadRow): number {
  return (geometry ?? []).reduce((sum, part) => sum + part.length - 1, 0);
}

/** Every row is there, with its area, holes, parts and texts. */
function expectTown(rows: readonly UploadRow[]): void {
  expect(rows).toHaveLength(METRES.length);
  for (const [index, { parts, attributes }] of METRES.entries()) {
    const row = rows[index];
    const area = areaOf(parts);
    expect(row?.fault).toBeNull();
    expect(Math.abs(areaOf(row?.geometry ?? []) - area)).toBeLessThan(0.001 * area);
    expect(row && holesOf(row)).toBe(parts.flat().length - parts.length);
    expect(row?.geometry).toHaveLength(parts.length);
    expect({ ...row?.properties }).toMatchObject(attributes);
  }
}

describe('an invented town', () => {
  test.each(FILES)('is read alike from %s', async (_, crs, make) => {
    const file = await make(METRES);
    const upload = await uploadOf(file);
    expect(upload).toMatchObject({ kind: 'footprints', count: METRES.length, crs });
    expect(upload.columns).toEqual(
      expect.arrayContaining(Object.keys(METRES[0]?.attributes ?? {})),
    );
    expectTown(await rowsOf(file));
  });

  test('is read from a workbook, which says nothing of where it is', async () => {
    const file = await workbookFile(METRES);
    expect(await uploadOf(file)).toMatchObject({ format: 'xlsx', layer: 'Edificios', crs: null });
    expectTown(await rowsOf(file));
  });

  test('can be read again and again', async () => {
    const upload = await uploadOf(geojsonFile(METRES, 'EPSG:25830'));
    for (let time = 0; time < 2; time += 1) {
      let count = 0;
      for await (const row of upload.rows()) count += row.row === count + 1 ? 1 : 0;
      expect(count).toBe(METRES.length);
    }
  });
});
