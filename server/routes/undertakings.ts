import {
  changeUndertakingSchema,
  undertakingParamsSchema,
  undertakingsQuerySchema,
  undertakingValuesSchema,
} from '../../shared/schemas/undertakings.ts';
import { addUndertaking } from '../commands/add-undertaking.ts';
import { changeUndertaking } from '../commands/change-undertaking.ts';
import { findUndertakings } from '../models/undertakings.ts';
import { presentUndertaking } from '../presenters/undertaking.ts';
import { defineRoute } from './define-route.ts';

export const undertakingRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/undertakings',
    access: { scheme: 'readUndertakings' },
    query: undertakingsQuerySchema,
    handle: async ({ services, actor, scheme, query }) => {
      const found = await findUndertakings(services.database, scheme.id, query);
      return found.map((undertaking) => presentUndertaking(undertaking, actor));
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/undertakings',
    access: { scheme: 'updateUndertakings' },
    body: undertakingValuesSchema,
    status: 201,
    handle: async ({ services, actor, scheme, body }) =>
      presentUndertaking(await addUndertaking(services, actor, scheme, body), actor),
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/undertakings/:undertakingId',
    access: { scheme: 'updateUndertakings' },
    params: undertakingParamsSchema,
    body: changeUndertakingSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const asked = { id: params.undertakingId, ...body };
      return presentUndertaking(await changeUndertaking(services, actor, scheme, asked), actor);
    },
  }),
];
