import {
  registerChoicesParamsSchema,
  registerExportQuerySchema,
  registerIdsQuerySchema,
  registerPlaceQuerySchema,
  registerQuerySchema,
} from '../../shared/schemas/register.ts';
import { isBesideColumn } from '../../shared/schemas/standing-columns.ts';
import { findChoices } from '../models/find-register-rows.ts';
import { registerCondition } from '../models/register-condition.ts';
import { presentRegisterPage } from '../presenters/register.ts';
import { besideChoices } from '../register/beside-choices.ts';
import { registerOf } from '../register/register-of.ts';
import { registerIds, registerOrder } from '../register/register-order.ts';
import { registerPage } from '../register/register-page.ts';
import { sendRegister } from '../exports/send-register.ts';
import { defineRoute } from './define-route.ts';

export const registerRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register',
    access: { scheme: 'readRegister' },
    query: registerQuerySchema,
    handle: async ({ services, scheme, query }) => {
      const register = await registerOf(services, scheme);
      return presentRegisterPage(register, await registerPage(services, register, query));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register/place',
    access: { scheme: 'readRegister' },
    query: registerPlaceQuerySchema,
    handle: async ({ services, scheme, query }) => {
      const register = await registerOf(services, scheme);
      const order = await registerOrder(services, register, query);
      return { index: order.indexOf(query.buildingId) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register/ids',
    access: { scheme: 'readRegister' },
    query: registerIdsQuerySchema,
    handle: async ({ services, scheme, query }) => ({
      ids: [...(await registerIds(services, await registerOf(services, scheme), query.filter))],
    }),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register/choices/:field',
    access: { scheme: 'readRegister' },
    params: registerChoicesParamsSchema,
    handle: async ({ services, scheme, params }) => {
      const register = await registerOf(services, scheme);
      const { field } = params;
      if (isBesideColumn(field)) return besideChoices(services, register, field);
      return findChoices(services.database, registerCondition(register, {}), field);
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register/export',
    access: { scheme: 'readRegister' },
    query: registerExportQuerySchema,
    handle: (call) => sendRegister(call),
  }),
];
