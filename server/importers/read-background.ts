import { boundingBox, type Box } from '../../shared/geometry/bounding-box.ts';
import type { BackgroundLayer } from '../../shared/schemas/background.ts';
import { AppError, type FieldFault } from '../errors.ts';
import { drawnGeometry, type DrawnGeometry } from './drawn-geometry.ts';
import { RowFault } from './geometry/row-fault.ts';
import { openSource } from './open-source.ts';
import { pacedRows } from './paced-rows.ts';
import { placeOfCrs } from './place-of-crs.ts';
import type { Properties } from './source.ts';

export type BackgroundRow = {
  readonly name: string | null;
  readonly geometry: DrawnGeometry;
  /** In degrees. */
  readonly bounds: Box;
};

const LONGEST_NAME = 200;
const MOST_FAULTS = 20;
const TAKEN = ['geojson', 'shapefile'];

function nameOf(properties: Properties): string | null {
  const given = Object.entries(properties).find(([name]) => name.toLowerCase() === 'name')?.[1];
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

/** A sentence about "it" as one about a row. */
function ofRow(row: number, sentence: string): string {
  return sentence.startsWith('It ') ? `Row ${row} ${sentence.slice(3)}` : `Row ${row}: ${sentence}`;
}

/** The features of an uploaded layer, or a refusal that names what is wrong by row: all of it or none. */
export async function readBackground(
  bytes: Buffer,
  layer: BackgroundLayer,
): Promise<BackgroundRow[]> {
  const source = await openSource(bytes);
  if (!TAKEN.includes(source.format)) {
    throw new AppError('unreadable', 'A background is GeoJSON or a zipped Shapefile.');
  }
  const place = await placeOfCrs(source);
  const rows: BackgroundRow[] = [];
  const faults: FieldFault[] = [];
  let count = 0;
  for await (const { row, geometry: given, fault, properties } of pacedRows(source)) {
    count += 1;
    try {
      if (fault !== null) throw new RowFault(fault);
      const geometry = drawnGeometry(given, layer, place);
      const name = nameOf(properties);
      rows.push({ name, geometry, bounds: boundingBox(pointsOf(geometry)) });
    } catch (error) {
      if (!(error instanceof RowFault)) throw error;
      faults.push({ path: `row ${row}`, message: ofRow(row, error.message) });
    }
  }
  if (count === 0) throw new AppError('unreadable', 'The file holds nothing to draw.');
  if (faults.length === 0) return rows;
  const message = `${faults.length} of ${count} rows are not right. Nothing was brought in.`;
  throw new AppError('invalid-input', message, faults.slice(0, MOST_FAULTS));
}
