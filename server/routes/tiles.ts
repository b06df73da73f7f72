import type { Response } from 'express';
import type { Sequelize } from 'sequelize';
import { backgroundTileSchema, buildingTileSchema } from '../../shared/schemas/tiles.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Services } from '../services.ts';
import { backgroundTile } from '../tiles/background-tile.ts';
import { buildingTile } from '../tiles/building-tile.ts';
import type { TilePlace } from '../tiles/tile-bounds.ts';
import { defineRoute } from './define-route.ts';

type TileCall = {
  readonly services: Services;
  readonly scheme: Scheme;
  readonly params: TilePlace & { readonly version: number };
  readonly res: Response;
};

type Kind = {
  readonly name: 'buildings' | 'background';
  readonly newest: number;
  readonly make: (database: Sequelize, schemeId: string, place: TilePlace) => Promise<Buffer>;
};

/**
 * Answers with a tile that never changes, since its version is in its address. An address of another
 * version leads to the newest: a map that is open while the register grows has no holes.
 */
async function answerTile(call: TileCall, { name, newest, make }: Kind): Promise<void> {
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

export const tileRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/tiles/buildings/:version/:z/:x/:y.pbf',
    access: { scheme: 'readRegister' },
    params: buildingTileSchema,
    handle: (call) => {
      const newest = call.scheme.registerVersion;
      return answerTile(call, { name: 'buildings', newest, make: buildingTile });
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/tiles/background/:version/:z/:x/:y.pbf',
    access: { scheme: 'readScheme' },
    params: backgroundTileSchema,
    handle: (call) => {
      const newest = call.scheme.backgroundVersion;
      return answerTile(call, { name: 'background', newest, make: backgroundTile });
    },
  }),
];
