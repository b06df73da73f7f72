import proj4 from 'proj4';

type Point = readonly [number, number];

/** Turns longitude and latitude in degrees into points of a system, by its proj4 definition. */
export function fromLonLat(definition: string): (point: Point) => [number, number] {
  const { forward } = proj4(definition);
  return ([longitude, latitude]) => {
    const [easting = NaN, northing = NaN] = forward([longitude, latitude]);
    return [easting, northing];
  };
}
