import { polygonArea } from '../../shared/geometry/polygon-area.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { ExportColumn, ExportedRow, ExportFile } from './export-file.ts';

type Ring = readonly (readonly [number, number])[];

/** Outer rings run anticlockwise and holes clockwise, as RFC 7946 wants them. */
function turned(ring: Ring, index: number): Ring {
  const isAnticlockwise = polygonArea(ring) > 0;
  return isAnticlockwise === (index === 0) ? ring : [...ring].reverse();
}

function geometryOf(lonLat: FootprintRings): object | null {
  const parts = lonLat.map((part) => part.map(turned));
  const [part, ...others] = parts;
  if (part === undefined) return null;
  if (others.length === 0) return { type: 'Polygon', coordinates: part };
  return { type: 'MultiPolygon', coordinates: parts };
}

function featureOf<Row>(
  { reference, row, lonLat = [] }: ExportedRow<Row>,
  columns: readonly ExportColumn<Row>[],
): object {
  return {
    type: 'Feature',
    id: reference,
    properties: Object.fromEntries(columns.map(({ name, property }) => [name, property(row)])),
    geometry: geometryOf(lonLat),
  };
}

/** Buildings as GeoJSON in longitude and latitude, piece by piece, then what is said about them. */
export async function* geojsonText<Row>(file: ExportFile<Row>): AsyncGenerator<string> {
  yield '{"type":"FeatureCollection","features":[';
  let separator = '\n';
  for await (const one of file.rows) {
    yield separator + JSON.stringify(featureOf(one, file.columns));
    separator = ',\n';
  }
  yield `\n],"about":${JSON.stringify(Object.fromEntries(file.about))}}\n`;
}
