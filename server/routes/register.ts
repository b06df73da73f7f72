import {
  registerChoicesParamsSchema,
  registerExportQuerySchema,
  registerIdsQuerySchema,
  registerPlaceQuerySchema,
  registerQuerySchema,
} from '../../shared/schemas/register.ts';
import { findChoices } from '../models/find-register-rows.ts';
import { registerCondition } from '../models/register-condition.ts';
import { presentRegisterPage } from '../presenters/register.ts';
import { registerIds, registerOrder } from '../register/register-order.ts';
import { registerPage } from '../register/register-page.ts';
import { sendExport } from '../exports/send-export.ts';
import { defineRoute } from './define-route.ts';

export const registerRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register',
    access: { scheme: 'readRegister' },
    query: registerQuerySchema,
    handle: async ({ services, scheme, query }) =>
      presentRegisterPage(scheme, await registerPage(services, scheme, query)),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register/place',
    access: { scheme: 'readRegister' },
    query: registerPlaceQuerySchema,
    handle: async ({ services, scheme, query }) => {
      const order = await registerOrder(services, scheme, query);
      return { index: order.indexOf(query.buildingId) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register/ids',
    access: { scheme: 'readRegister' },
    query: registerIdsQuerySchema,
    handle: async ({ services, scheme, query }) => ({
      ids: await registerIds(services, scheme, query.filter),
    }),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register/choices/:field',
    access: { scheme: 'readRegister' },
    params: registerChoicesParamsSchema,
    handle: ({ services, scheme, params }) =>
      findChoices(services.database, registerCondition(scheme.id, {}), params.field),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register/export',
    access: { scheme: 'readRegister' },
    query: registerExportQuerySchema,
    handle: (call) => sendExport(call),
  }),
];
