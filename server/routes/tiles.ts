import { backgroundTileSchema, buildingTileSchema } from '../../shared/schemas/tiles.ts';
import { backgroundTile } from '../tiles/background-tile.ts';
import { buildingTile } from '../tiles/building-tile.ts';
import { answerTile } from './answer-tile.ts';
import { defineRoute } from './define-route.ts';

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
