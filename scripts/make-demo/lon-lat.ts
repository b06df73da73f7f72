import proj4 from 'proj4';
import type { Feature, Geometry } from './features.ts';
import type { Point } from './vector.ts';

const toLonLat = proj4('+proj=utm +zone=31 +datum=WGS84 +units=m +no_defs', 'WGS84').forward;

function place([easting, northing]: Point): [number, number] {
  const [longitude = 0, latitude = 0] = toLonLat([easting, northing]);
  return [longitude, latitude];
}

function geometryInLonLat(geometry: Geometry): GeoJSON.Geometry {
  switch (geometry.type) {
    case 'Point':
      return { type: 'Point', coordinates: place(geometry.coordinates) };
    case 'LineString':
      return { type: 'LineString', coordinates: geometry.coordinates.map(place) };
    case 'Polygon':
      return { type: 'Polygon', coordinates: geometry.coordinates.map((ring) => ring.map(place)) };
  }
}

/** A feature of the town's grid in longitude and latitude, as tiles want it. */
export function inLonLat({ id, properties, geometry }: Feature): GeoJSON.Feature {
  return { type: 'Feature', id, properties, geometry: geometryInLonLat(geometry) };
}
