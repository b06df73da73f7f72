type Point = readonly [number, number];
type Properties = Readonly<Record<string, unknown>>;

/** Where the squares of tests stand: in the middle of UTM zone 31. */
export const CORNER: Point = [500_000, 6_080_000];

/** A closed rectangle, east and north of the tests' corner, in metres. */
export function rectangle(east: number, north: number, width = 10, depth = 8): Point[] {
  const [x, y] = [CORNER[0] + east, CORNER[1] + north];
  return [[x, y], [x + width, y], [x + width, y + depth], [x, y + depth], [x, y]]; // prettier-ignore
}

/** A ring that crosses itself like a bow tie. */
export function bowTie(east: number, north: number, size = 10): Point[] {
  const [x, y] = [CORNER[0] + east, CORNER[1] + north];
  return [[x, y], [x + size, y + size], [x + size, y], [x, y + size], [x, y]]; // prettier-ignore
}

/** A feature of GeoJSON with a ring, with rings, or with parts. */
export function feature(
  properties: Properties,
  geometry: readonly Point[] | { type: string; coordinates: unknown } | null,
): object {
  const drawn = Array.isArray(geometry) ? { type: 'Polygon', coordinates: [geometry] } : geometry;
  return { type: 'Feature', properties, geometry: drawn };
}

/** A file of GeoJSON in a system; without one it says nothing. */
export function geojson(features: readonly object[], crs: number | null = 32631): string {
  const said =
    crs === null
      ? {}
      : { crs: { type: 'name', properties: { name: `urn:ogc:def:crs:EPSG::${crs}` } } };
  return JSON.stringify({ type: 'FeatureCollection', ...said, features });
}

/** So many houses in rows, each with a reference and a name. */
export function houses(count: number): object[] {
  return Array.from({ length: count }, (_, index) => {
    const [column, row] = [index % 100, Math.floor(index / 100)];
    const properties = { ref: `H-${index + 1}`, name: `House ${index + 1}`, floors: 2 };
    return feature(properties, rectangle(20 * column, 20 * row));
  });
}
