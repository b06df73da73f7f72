import type { Feature } from 'geojson';
import type { Sequelize } from 'sequelize';
import { findBuildingsInBox, type DrawnBuilding } from '../models/find-buildings-in-box.ts';
import { encodeTile } from './encode-tile.ts';
import { tileBounds, type TilePlace } from './tile-bounds.ts';

function featureOf({ id, reference, name, lonLat }: DrawnBuilding): Feature {
  const properties = name === null ? { reference } : { reference, name };
  return {
    type: 'Feature',
    id,
    properties,
    geometry: { type: 'MultiPolygon', coordinates: lonLat },
  };
}

/** A tile of a scheme's buildings, by their numbers, corners kept so that shared walls stay shared. */
export async function buildingTile(
  database: Sequelize,
  schemeId: string,
  place: TilePlace,
): Promise<Buffer> {
  const buildings = await findBuildingsInBox(database, schemeId, tileBounds(place));
  return encodeTile({ buildings: buildings.map(featureOf) }, place, 0);
}
