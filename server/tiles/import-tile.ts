import type { Feature } from 'geojson';
import type { Sequelize } from 'sequelize';
import { findRowsInBox, type DrawnRow } from '../models/import-report.ts';
import { encodeTile } from './encode-tile.ts';
import { tileBounds, type TilePlace } from './tile-bounds.ts';

function featureOf({ row, reference, outcome, lonLat }: DrawnRow): Feature {
  return {
    type: 'Feature',
    id: row,
    properties: reference === null ? { outcome } : { outcome, reference },
    geometry: { type: 'MultiPolygon', coordinates: lonLat },
  };
}

/** A tile of the footprints of an import by their rows, coloured by what becomes of them. */
export async function importTile(
  database: Sequelize,
  importId: string,
  place: TilePlace,
): Promise<Buffer> {
  const rows = await findRowsInBox(database, importId, tileBounds(place));
  return encodeTile({ rows: rows.map(featureOf) }, place, 0);
}
