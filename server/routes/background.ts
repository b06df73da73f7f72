import { BACKGROUND_LIMITS, backgroundParamsSchema } from '../../shared/schemas/background.ts';
import { replaceBackground } from '../commands/replace-background.ts';
import { readBackground } from '../importers/read-background.ts';
import { receiveFile } from '../middleware/receive-file.ts';
import { presentBackground, presentReplacedLayer } from '../presenters/background.ts';
import { countBackground } from '../models/count-background.ts';
import { defineRoute } from './define-route.ts';

export const backgroundRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/background',
    access: { scheme: 'readRegister' },
    handle: async ({ services, scheme }) =>
      presentBackground(await countBackground(services.database, scheme.id)),
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/background/:layer',
    access: { scheme: 'updateBackground' },
    params: backgroundParamsSchema,
    handle: async ({ services, actor, scheme, params: { layer }, req, res }) => {
      const bytes = await receiveFile(req, res, BACKGROUND_LIMITS.bytes);
      const rows = await readBackground(bytes, layer);
      await replaceBackground(services, actor, scheme, { layer, rows });
      return presentReplacedLayer(scheme, layer, rows.length);
    },
  }),
  defineRoute({
    method: 'delete',
    path: '/api/schemes/:schemeId/background/:layer',
    access: { scheme: 'updateBackground' },
    params: backgroundParamsSchema,
    handle: async ({ services, actor, scheme, params: { layer } }) => {
      await replaceBackground(services, actor, scheme, { layer, rows: [] });
      return presentReplacedLayer(scheme, layer, 0);
    },
  }),
];
