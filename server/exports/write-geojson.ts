import { polygonArea } from '../../shared/geometry/polygon-area.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { valueOf, type ExportedBuilding, type ExportJob } from './export-job.ts';

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

function featureOf({ building, lonLat = [] }: ExportedBuilding, { columns }: ExportJob): object {
  return {
    type: 'Feature',
    id: building.reference,
    properties: Object.fromEntries(columns.map((column) => [column, valueOf(building, column)])),
    geometry: geometryOf(lonLat),
  };
}

/** The register as GeoJSON in longitude and latitude, piece by piece. */
export async function* geojsonText(job: ExportJob): AsyncGenerator<string> {
  yield '{"type":"FeatureCollection","features":[';
  let separator = '\n';
  for await (const one of job.buildings) {
    yield separator + JSON.stringify(featureOf(one, job));
    separator = ',\n';
  }
  yield '\n]}\n';
}
