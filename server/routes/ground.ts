import {
  GROUND_LIMITS,
  groundFileQuerySchema,
  groundLevelSchema,
} from '../../shared/schemas/ground.ts';
import { removeGround, setGround } from '../commands/set-ground.ts';
import { readGround } from '../ground/read-ground.ts';
import { receiveFile } from '../middleware/receive-file.ts';
import { presentGround } from '../presenters/ground.ts';
import { defineRoute } from './define-route.ts';

export const groundRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/ground',
    access: { scheme: 'readRegister' },
    handle: ({ scheme }) => presentGround(scheme),
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/ground',
    access: { scheme: 'updateRegister' },
    body: groundLevelSchema,
    handle: async ({ services, actor, scheme, body: { level, source } }) => {
      await setGround(services, actor, scheme, { ground: { kind: 'level', level }, source });
      return presentGround(scheme);
    },
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/ground/file',
    access: { scheme: 'updateRegister' },
    query: groundFileQuerySchema,
    handle: async ({ services, actor, scheme, query: { source, crs }, req, res }) => {
      const bytes = await receiveFile(req, res, GROUND_LIMITS.bytes);
      const ground = await readGround(bytes, { crs, schemeCrs: scheme.crs });
      await setGround(services, actor, scheme, { ground, source });
      return presentGround(scheme);
    },
  }),
  defineRoute({
    method: 'delete',
    path: '/api/schemes/:schemeId/ground',
    access: { scheme: 'updateRegister' },
    handle: async ({ services, actor, scheme }) => {
      await removeGround(services, actor, scheme);
      return presentGround(scheme);
    },
  }),
];
