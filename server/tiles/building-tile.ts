import type { Feature } from 'geojson';
import type { Sequelize } from 'sequelize';
import { findBuildingsInBox, type DrawnBuilding } from '../models/find-buildings-in-box.ts';
import { encodeTile } from './encode-tile.ts';
import { tileBounds, type TilePlace } from './tile-bounds.ts';

/** From here on names, references and numbers of buildings are written on the map. */
const LABELS_FROM = 16;

function propertiesOf({ reference, name }: DrawnBuilding): Record<string, string> {
  return name === null ? { reference } : { reference, name };
}

function featureOf(building: DrawnBuilding): Feature {
  return {
    type: 'Feature',
    id: building.id,
    properties: propertiesOf(building),
    geometry: { type: 'MultiPolygon', coordinates: building.lonLat },
  };
}

function middleOf(lonLat: DrawnBuilding['lonLat']): [longitude: number, latitude: number] {
  const corners = lonLat.flat(2);
  const longitudes = corners.map(([longitude = 0]) => longitude);
  const latitudes = corners.map(([, latitude = 0]) => latitude);
  return [
    (Math.min(...longitudes) + Math.max(...longitudes)) / 2,
    (Math.min(...latitudes) + Math.max(...latitudes)) / 2,
  ];
}

/** Where to write on buildings, each once in its middle: one cut by tiles would be named in each. */
function labelOf(building: DrawnBuilding): Feature {
  return {
    type: 'Feature',
    id: building.id,
    properties: propertiesOf(building),
    geometry: { type: 'Point', coordinates: middleOf(building.lonLat) },
  };
}

function labelsOf(buildings: readonly DrawnBuilding[], zoom: number): Feature[] {
  return zoom < LABELS_FROM ? [] : buildings.map(labelOf);
}

/**
 * A tile of a scheme's buildings, by their numbers, corners kept so that shared walls stay shared; from
 * close by with where to write their names.
 */
export async function buildingTile(
  database: Sequelize,
  schemeId: string,
  place: TilePlace,
): Promise<Buffer> {
  const buildings = await findBuildingsInBox(database, schemeId, tileBounds(place));
  const layers = { buildings: buildings.map(featureOf), labels: labelsOf(buildings, place.z) };
  return encodeTile(layers, place, 0);
}
