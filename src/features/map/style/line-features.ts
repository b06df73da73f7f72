import type { LineShape, SectionShape } from '../map-line.ts';
import type { GridPlace, GridProjection } from '../place/grid-projection.ts';

type Position = [number, number];

function positions(projection: GridProjection, places: readonly GridPlace[]): Position[] {
  return places.flatMap((place): Position[] => {
    const lonLat = projection.toLonLat(place);
    return lonLat === null ? [] : [[lonLat[0], lonLat[1]]];
  });
}

function areaOf(
  projection: GridProjection,
  rings: readonly (readonly GridPlace[])[],
): GeoJSON.Feature {
  const coordinates = rings.map((ring) => positions(projection, ring));
  return {
    type: 'Feature',
    properties: { kind: 'band' },
    geometry: { type: 'Polygon', coordinates },
  };
}

function featureOf(
  projection: GridProjection,
  shape: LineShape | SectionShape,
): GeoJSON.Feature | null {
  const { kind } = shape;
  if (kind === 'chainage' || kind === 'shaft' || kind === 'name') {
    const [coordinates] = positions(projection, [shape.place]);
    if (coordinates === undefined) return null;
    const properties = { kind, text: shape.text };
    return { type: 'Feature', properties, geometry: { type: 'Point', coordinates } };
  }
  if (kind === 'band') return areaOf(projection, shape.rings);
  const properties = kind === 'contour' ? { kind, level: shape.level } : { kind };
  const coordinates = positions(projection, shape.places);
  if (coordinates.length < 2) return null;
  return { type: 'Feature', properties, geometry: { type: 'LineString', coordinates } };
}

/** A designed line and its settlement, or the mark of a section, as the map draws it. */
export function lineFeatures(
  projection: GridProjection,
  shapes: readonly (LineShape | SectionShape)[],
): GeoJSON.FeatureCollection {
  const features = shapes.flatMap((shape) => featureOf(projection, shape) ?? []);
  return { type: 'FeatureCollection', features };
}
