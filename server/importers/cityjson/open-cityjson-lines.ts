import { AppError } from '../../errors.ts';
import { asObject, LARGEST_FEATURE } from '../json/open-geojson.ts';
import { parseSpan } from '../json/json-scan.ts';
import type { Span } from '../json/span.ts';
import type { Source, SourceRow } from '../source.ts';
import { readCityObject } from './city-objects.ts';
import { cityRow, isOneRow } from './city-rows.ts';
import { cityjsonSource, readHeading } from './open-cityjson.ts';
import { listedVertices, placedVertices, type Transform } from './vertices.ts';

function unreadable(line: number, what: string): AppError {
  return new AppError('unreadable', `The CityJSON cannot be read: line ${line} ${what}.`);
}

function* rowsOf(
  bytes: Buffer,
  values: Iterable<Span>,
  transform: Transform,
): Generator<SourceRow> {
  let [line, row] = [0, 0];
  for (const span of values) {
    line += 1;
    if (line === 1) continue;
    if (span.end - span.start > LARGEST_FEATURE) throw unreadable(line, 'is larger than 20 MB');
    const { type, CityObjects: given, vertices: list } = asObject(parseSpan(bytes, span));
    if (type !== 'CityJSONFeature') throw unreadable(line, 'is no CityJSONFeature');
    const objects = asObject(given);
    const vertices = placedVertices(listedVertices(list), transform);
    const find = (id: string) => readCityObject(objects[id]);
    for (const [id, value] of Object.entries(objects)) {
      const object = readCityObject(value);
      if (object === undefined || !isOneRow(object)) continue;
      row += 1;
      yield cityRow(row, id, object, { find, vertices });
    }
  }
}

/** Reads CityJSON of which each line after the first is a feature with vertices of its own. */
export async function openCityjsonLines(
  bytes: Buffer,
  values: () => Iterable<Span>,
  top: ReadonlyMap<string, Span>,
): Promise<Source> {
  const { crs, transform } = await readHeading(bytes, top);
  return cityjsonSource(crs, () => rowsOf(bytes, values(), transform));
}
