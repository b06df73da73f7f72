import {
  changeMeasureSchema,
  measureParamsSchema,
  measuresQuerySchema,
  measureValuesSchema,
} from '../../shared/schemas/measures.ts';
import { addMeasure } from '../commands/add-measure.ts';
import { changeMeasure } from '../commands/change-measure.ts';
import { findMeasures } from '../models/measures.ts';
import { presentMeasure } from '../presenters/measure.ts';
import { defineRoute } from './define-route.ts';

export const measureRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/measures',
    access: { scheme: 'readDecisions' },
    query: measuresQuerySchema,
    handle: async ({ services, scheme, query }) =>
      (await findMeasures(services.database, scheme.id, query)).map(presentMeasure),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/measures',
    access: { scheme: 'updateMeasures' },
    body: measureValuesSchema,
    status: 201,
    handle: async ({ services, actor, scheme, body }) =>
      presentMeasure(await addMeasure(services, actor, scheme, body)),
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/measures/:measureId',
    access: { scheme: 'updateMeasures' },
    params: measureParamsSchema,
    body: changeMeasureSchema,
    handle: async ({ services, actor, scheme, params, body }) =>
      presentMeasure(
        await changeMeasure(services, actor, scheme, { id: params.measureId, ...body }),
      ),
  }),
];
