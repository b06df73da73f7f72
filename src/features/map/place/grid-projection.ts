import proj4 from 'proj4';

export type LonLat = readonly [longitude: number, latitude: number];
/** Easting and northing in metres. */
export type GridPlace = readonly [easting: number, northing: number];

export type GridProjection = {
  readonly toGrid: (place: LonLat) => GridPlace | null;
  readonly toLonLat: (place: GridPlace) => LonLat | null;
};

function finite(compute: () => [number, number]): readonly [number, number] | null {
  try {
    const [x, y] = compute();
    return Number.isFinite(x) && Number.isFinite(y) ? [x, y] : null;
  } catch {
    // proj4 throws where a system cannot reach
    return null;
  }
}

/** The scheme's grid; null is what lies too far outside of it. */
export function createGridProjection(definition: string): GridProjection {
  const grid = proj4(definition);
  return {
    toGrid: ([longitude, latitude]) => finite(() => grid.forward([longitude, latitude])),
    toLonLat: ([easting, northing]) => finite(() => grid.inverse([easting, northing])),
  };
}
