import type { Response } from 'express';
import type { Sequelize } from 'sequelize';
import type { Scheme } from '../models/scheme.ts';
import type { Services } from '../services.ts';
import type { TilePlace } from '../tiles/tile-bounds.ts';

type TileCall = {
  readonly services: Services;
  readonly scheme: Scheme;
  readonly params: TilePlace & { readonly version: number };
  readonly res: Response;
};

type Kind = {
  /** As it stands in the address. */
  readonly name: string;
  readonly newest: number;
  readonly make: (database: Sequelize, id: string, place: TilePlace) => Promise<Buffer>;
};

/**
 * Answers with a tile that never changes, since its version is in its address. An address of another
 * version leads to the newest: a map that is open while the register grows has no holes.
 */
export async function answerTile(call: TileCall, { name, newest, make }: Kind): Promise<void> {
  const { services, scheme, params, res } = call;
  const { version, z, x, y } = params;
  if (version !== newest) {
    res.set('Cache-Control', 'no-store');
    const place = `${newest}/${z}/${x}/${y}.pbf`;
    res.redirect(307, `/api/schemes/${scheme.id}/tiles/${name}/${place}`);
    return;
  }
  const key = [name, scheme.id, version, z, x, y].join('/');
  const tile = await services.tiles.get(key, () => make(services.database, scheme.id, params));
  res.set('Cache-Control', 'private, max-age=31536000, immutable');
  if (tile.byteLength === 0) res.status(204).end();
  else res.type('application/vnd.mapbox-vector-tile').send(tile);
}
