import type { HostileFile } from './hostile-file.ts';

const SQUARE = [[[3, 54], [3.1, 54], [3.1, 54.1], [3, 54]]]; // prettier-ignore

function feature(coordinates: string, type = 'Polygon', properties = '{"a":1}'): string {
  return `{"type":"Feature","properties":${properties},"geometry":{"type":"${type}","coordinates":${coordinates}}}`;
}

function collection(features: string): string {
  return `{"type":"FeatureCollection","features":[${features}]}`;
}

const WHOLE = collection(feature(JSON.stringify(SQUARE)));

function city(more: string): string {
  return `{"type":"CityJSON","version":"2.0","transform":{"scale":[1,1,1],"translate":[0,0,0]},${more}}`;
}

const HOUSE = `"CityObjects":{"a":{"type":"Building","geometry":[{"type":"MultiSurface","lod":"0","boundaries":[[[0,1,2]]]}]}}`;

/** JSON that is broken, endless or about something else. */
export const JSON_FILES: readonly HostileFile[] = [
  {
    name: 'JSON 200,000 deep',
    make: () => '['.repeat(200_000) + ']'.repeat(200_000),
    says: /^unreadable: .*nested more than 100 deep/,
  },
  {
    name: 'properties 200,000 deep',
    make: () => collection(feature('[]', 'Polygon', '{"a":'.repeat(200_000) + '1' + '}'.repeat(200_000))), // prettier-ignore
    says: /^unreadable: .*nested more than 100 deep/,
  },
  {
    name: 'NaN as a coordinate',
    make: () => collection(feature('[[[NaN,54],[3,54],[3,55],[3,54]]]')),
    says: /features\[0\]\.geometry\.coordinates\[0\]\[0\]\[0\]: "NaN" is not a value that JSON can hold \(line 1, column \d+\)/,
  },
  {
    name: 'Infinity far into the file',
    make: () =>
      collection(`${`${feature(JSON.stringify(SQUARE))},\n`.repeat(150_000)}{"a":-Infinity}`),
    says: /"-Infinity" is not a value that JSON can hold \(line 150001, column \d+\)/,
  },
  {
    name: 'GeoJSON that is cut off',
    make: () => collection(`${feature(JSON.stringify(SQUARE))},`.repeat(1000)).slice(0, 90_000),
    says: /^unreadable: .*the text ends too early \(line 1, column 90001\)/,
  },
  {
    name: 'JSON with something behind its end',
    make: () => `${WHOLE}\n;x`,
    says: /more text follows its end \(line 2, column 1\)/,
  },
  {
    name: 'a text of 100 MB that is not closed',
    make: () => `{"type":"FeatureCollection","name":"${'x'.repeat(100_000_000)}`,
    says: /the text ends too early/,
  },
  {
    name: 'coordinates that are a text',
    make: () => collection(feature('"abc"')),
    says: /Of its one row: Its coordinates are no lists of numbers/,
  },
  {
    name: 'coordinates that are an object',
    make: () => collection(feature('{}')),
    says: /Its coordinates are no lists of numbers/,
  },
  {
    name: 'coordinates that are null',
    make: () => collection(feature('null')),
    says: /Its coordinates are no lists of numbers/,
  },
  {
    name: 'corners beyond all numbers',
    make: () => collection(feature('[[[1e999,54],[3,54],[3,55],[3,54]]]')),
    says: /a corner that is not two numbers/,
  },
  {
    name: 'points only',
    make: () => collection(`${feature('[3,54]', 'Point')},${feature('[3,54]', 'Point')}`),
    says: /none of its 2 rows is right\. Row 1: It is a point: a footprint is a polygon/,
  },
  {
    name: 'lines only',
    make: () => collection(feature(JSON.stringify(SQUARE[0]), 'LineString')),
    says: /It is a line: a footprint is a polygon/,
  },
  {
    name: 'a ring of 10 million corners',
    make: () => collection(feature(`[[${'[3,54],'.repeat(10_000_000)}[3,54]]]`)),
    says: /larger than 20 MB: a footprint has at most 10,000 corners/,
  },
  {
    name: 'a ring of 20,000 corners',
    make: () => collection(feature(`[[${'[3,54],'.repeat(20_000)}[3,54]]]`)),
    says: /more than 10,000 corners/,
  },
  {
    name: '10,000 properties',
    make: () => {
      const names = Array.from({ length: 10_000 }, (_, k) => `"a${k}":1`).join(',');
      return collection(feature(JSON.stringify(SQUARE), 'Polygon', `{${names}}`));
    },
    says: /^too-large: .*more than 200 columns/,
  },
  {
    name: 'a million features',
    make: () => collection(`${'{},'.repeat(1_000_000)}{}`),
    says: /^too-large: .*more than 200,000 rows/,
  },
  {
    name: 'a member a million times',
    make: () => `{${Array.from({ length: 1_000_000 }, (_, k) => `"a${k}":1`).join(',')}}`,
    says: /one object with thousands of members/,
  },
  {
    name: 'TopoJSON',
    make: () => '{"type":"Topology","objects":{}}',
    says: /seems to be TopoJSON/,
  },
  {
    name: 'Esri JSON',
    make: () => '{"geometryType":"esriGeometryPolygon","features":[]}',
    says: /seems to be Esri JSON/,
  },
  { name: 'no features', make: () => collection(''), says: /holds no rows/ },
  {
    name: 'CityJSON of another version',
    make: () => city('"CityObjects":{}').replace('2.0', '0.8'),
    says: /its version is "0\.8", and versions 1\.0 to 2\.0 are taken/,
  },
  {
    name: 'CityJSON without vertices',
    make: () => city(HOUSE),
    says: /it has no vertices/,
  },
  {
    name: 'CityJSON with vertices that are texts',
    make: () => city(`${HOUSE},"vertices":[[1,2,3],["a","b","c"]]`),
    says: /vertex 1 of a list is not three numbers/,
  },
  {
    name: 'CityJSON with corners that are not there',
    make: () => city(`${HOUSE},"vertices":[[1,2,3]]`),
    says: /a corner that is not among the vertices/,
  },
  {
    name: 'CityJSON with children of themselves',
    make: () => city('"CityObjects":{"a":{"type":"Building","children":["a"]}},"vertices":[]'),
    says: /no face on the ground/,
  },
  {
    name: 'CityJSON that is cut off',
    make: () => city(`${HOUSE},"vertices":[[1,2,3],[4,5,6]]`).slice(0, -9),
    says: /the text ends too early/,
  },
];
