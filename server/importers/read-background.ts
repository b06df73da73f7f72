import { setImmediate } from 'node:timers/promises';
import { boundingBox, type Box } from '../../shared/geometry/bounding-box.ts';
import { BACKGROUND_LIMITS, type BackgroundLayer } from '../../shared/schemas/background.ts';
import { AppError, type FieldFault } from '../errors.ts';
import { drawnGeometry, FeatureFault, type DrawnGeometry } from './drawn-geometry.ts';
import { readGeojson } from './read-geojson.ts';
import { readShapefile } from './read-shapefile.ts';

export type BackgroundRow = {
  readonly name: string | null;
  readonly geometry: DrawnGeometry;
  /** In degrees. */
  readonly bounds: Box;
};

const LONGEST_NAME = 200;
const MOST_FAULTS = 20;
/** Others are served between so many features. */
const AT_ONCE = 2000;

function isZip(bytes: Buffer): boolean {
  return bytes.toString('latin1', 0, 2) === 'PK';
}

function nameOf(given: unknown): string | null {
  if (typeof given !== 'string') return null;
  const name = given
    .replaceAll(/\p{Cc}+/gu, ' ')
    .trim()
    .slice(0, LONGEST_NAME);
  return name === '' ? null : name;
}

function pointsOf(geometry: DrawnGeometry): readonly (readonly [number, number])[] {
  const points: [number, number][] = [];
  function collect(value: readonly unknown[]): void {
    const [x, y] = value;
    if (typeof x === 'number' && typeof y === 'number') points.push([x, y]);
    else for (const one of value) if (Array.isArray(one)) collect(one);
  }
  collect(geometry.coordinates);
  return points;
}

/** The features of an uploaded layer, or a refusal that names what is wrong by row: all of it or none. */
export async function readBackground(
  bytes: Buffer,
  layer: BackgroundLayer,
): Promise<BackgroundRow[]> {
  const { features, place } = await (isZip(bytes) ? readShapefile(bytes) : readGeojson(bytes));
  if (features.length === 0) throw new AppError('unreadable', 'The file holds nothing to draw.');
  if (features.length > BACKGROUND_LIMITS.features) {
    throw new AppError('too-large', 'The file holds more than 200,000 features.');
  }
  const rows: BackgroundRow[] = [];
  const faults: FieldFault[] = [];
  for (const [index, { geometry: given, name }] of features.entries()) {
    if (index % AT_ONCE === AT_ONCE - 1) await setImmediate();
    try {
      const geometry = drawnGeometry(given, layer, place);
      rows.push({ name: nameOf(name), geometry, bounds: boundingBox(pointsOf(geometry)) });
    } catch (error) {
      if (!(error instanceof FeatureFault)) throw error;
      faults.push({ path: `row ${index + 1}`, message: `Row ${index + 1} ${error.message}.` });
    }
  }
  if (faults.length === 0) return rows;
  const message = `${faults.length} of ${features.length} rows are not right. Nothing was brought in.`;
  throw new AppError('invalid-input', message, faults.slice(0, MOST_FAULTS));
}
