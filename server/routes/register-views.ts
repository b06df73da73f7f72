import { literal } from 'sequelize';
import {
  newRegisterViewSchema,
  registerViewParamsSchema,
} from '../../shared/schemas/register-views.ts';
import { deleteRegisterView } from '../commands/delete-register-view.ts';
import { keepRegisterView } from '../commands/keep-register-view.ts';
import { RegisterView } from '../models/register-view.ts';
import { presentRegisterView } from '../presenters/register-view.ts';
import { defineRoute } from './define-route.ts';

export const registerViewRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/register-views',
    access: { scheme: 'readRegister' },
    handle: async ({ actor, scheme }) => {
      const views = await RegisterView.findAll({
        where: { schemeId: scheme.id, personId: actor.id },
        order: [literal('name collate natural_order'), 'id'],
      });
      return views.map(presentRegisterView);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/register-views',
    access: { scheme: 'readRegister' },
    body: newRegisterViewSchema,
    status: 201,
    handle: async ({ services, actor, scheme, body }) =>
      presentRegisterView(await keepRegisterView(services, actor, scheme, body)),
  }),
  defineRoute({
    method: 'delete',
    path: '/api/schemes/:schemeId/register-views/:viewId',
    access: { scheme: 'readRegister' },
    params: registerViewParamsSchema,
    handle: ({ services, actor, scheme, params }) =>
      deleteRegisterView(services, actor, scheme, params.viewId),
  }),
];
