import type { DraftShape } from '../map-drawing.ts';
import type { GridPlace, GridProjection } from '../place/grid-projection.ts';

type Position = [number, number];

function positions(projection: GridProjection, places: readonly GridPlace[]): Position[] {
  return places.flatMap((place): Position[] => {
    const lonLat = projection.toLonLat(place);
    return lonLat === null ? [] : [[lonLat[0], lonLat[1]]];
  });
}

function geometryOf(projection: GridProjection, shape: DraftShape): GeoJSON.Geometry | null {
  switch (shape.kind) {
    case 'area':
      return {
        type: 'Polygon',
        coordinates: shape.rings.map((ring) => {
          const corners = positions(projection, ring);
          return [...corners, ...corners.slice(0, 1)];
        }),
      };
    case 'line':
      return { type: 'LineString', coordinates: positions(projection, shape.places) };
    case 'point':
    case 'text': {
      const [coordinates] = positions(projection, [shape.place]);
      return coordinates === undefined ? null : { type: 'Point', coordinates };
    }
  }
}

/** What is seen of a drawing, as the map draws it. */
export function draftFeatures(
  projection: GridProjection,
  shapes: readonly DraftShape[],
): GeoJSON.FeatureCollection {
  const features = shapes.flatMap((shape): GeoJSON.Feature[] => {
    const geometry = geometryOf(projection, shape);
    if (geometry === null) return [];
    const { kind } = shape;
    const look = 'look' in shape ? shape.look : 'text';
    const text = 'text' in shape ? (shape.text ?? '') : '';
    return [{ type: 'Feature', properties: { kind, look, text }, geometry }];
  });
  return { type: 'FeatureCollection', features };
}
